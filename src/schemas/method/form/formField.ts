/** One column of a field that takes lines, in the order in which a line holds them. */
export interface LineColumn {
  name: string;
  label: string;
  unit?: string;
  kind: 'number' | 'text' | 'flag';
  /** May be left out at the end of a line, or given as a dash. */
  optional?: boolean;
}

interface Common {
  /** Where the value goes in the request, as in `demand.peakLead.mean`. */
  path: string;
  label: string;
  unit?: string;
  hint?: string;
  optional?: boolean;
  /** Fields of one section stand together under its name. */
  section?: string;
}

/**
 * A field of a calculator's form: which text a person writes and which part of the request it becomes. `numbers` and
 * `samples` become a list, `rows` a list of objects, `table` a list of lists; samples may come from a file.
 */
export type FormField = Common &
  (
    | { kind: 'number' | 'text' | 'flag' | 'numbers' | 'samples' | 'table' }
    | { kind: 'choice'; options: readonly { value: string; label: string }[] }
    | { kind: 'rows'; columns: readonly LineColumn[]; oneLine?: boolean }
  );

/** Texts by path. */
export type FormTexts = Readonly<Record<string, string>>;

/** The name and id of a field's control. */
export const controlName = ({ path }: Pick<FormField, 'path'>): string => path.replaceAll('.', '-');
