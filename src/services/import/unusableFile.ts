import { AppError } from '#src/errors/appError.ts';

/** Where in a file: rows and columns are counted from 1, as a spreadsheet does. */
export interface Place {
  file: string;
  row?: number;
  column?: number;
}

/** `battery.csv, row 3, column 5`. */
export const placeWords = ({ file, row, column }: Place): string =>
  [file, row === undefined ? '' : `, row ${row}`, column === undefined ? '' : `, column ${column}`].join('');

/**
 * The error of a file that cannot be read as a whole.
 *
 * @throws {AppError} invalid, always, its message beginning with the place
 */
export function unusableFile(place: Place, what: string): never {
  const where = placeWords(place);
  throw new AppError('invalid', `${where}: ${what}`, [{ path: where, message: what }]);
}
