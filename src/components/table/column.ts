/** A column of a DataTable: its unit stands in the header, not in the cells. */
export interface Column {
  header: string;
  unit?: string;
  /** Right-aligned, in tabular numerals. */
  numeric?: boolean;
  centred?: boolean;
  /** A column of forest rows: the scale they share, drawn below the header. */
  forest?: { range: number; width: number; ticks?: readonly number[] };
  /** A link that sorts by this column; `direction` is how it is sorted now. */
  sort?: { href: string; direction: 'ascending' | 'descending' | null };
}
