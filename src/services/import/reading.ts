import type { NamedAthlete } from '#src/services/import/athleteNames.ts';
import type { DateOrder } from '#src/domain/units/parseDate.ts';

/** An athlete of the academy as the readers need one. */
export interface KnownAthlete extends NamedAthlete {
  id: string;
  plays: 'left' | 'right';
  birthDate: string;
}

/** What a reader is told beside the table. */
export interface ReaderSettings {
  athletes: readonly KnownAthlete[];
  dateOrder: DateOrder | null;
  /** Order of the dates in file names. */
  nameOrder: DateOrder | null;
}

/** Where a reading stands in its file, and how the report speaks of it. */
export interface ReadingPlace {
  file: string;
  line: number;
  column: number;
  label: string;
}

/** A row or cell that was read, or the reason why it cannot be. */
export type Reading<T> = ReadingPlace & ({ value: T; refused: null } | { value: null; refused: string });

/** Rows and cells that are no data: units, repeated headings, averages. */
export interface LeftOut {
  file: string;
  line: number;
  why: string;
}

/** What a reader gives back. */
export interface Readings<T> {
  readings: Reading<T>[];
  leftOut: LeftOut[];
  notes: string[];
}
