import { unusableFile } from '#src/services/import/unusableFile.ts';

/** A file's text with `\n` line ends and without a byte order mark; `note` says where the encoding was not certain. */
export interface DecodedText {
  text: string;
  encoding: 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';
  note: string | null;
}

/** Files beyond this are refused unread. */
export const MOST_BYTES = 25_000_000;

// Node's own decoder of this name gives control characters for these 32 bytes.
const WINDOWS_1252_HIGH = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';

/**
 * Reads bytes as text: UTF-8 or UTF-16 by their mark, else UTF-8, else Windows-1252 as spreadsheets of old write it.
 *
 * @throws {AppError} invalid with file, row and column for a file that is too large, empty or not text
 */
export function decodeText(bytes: Uint8Array, file: string): DecodedText {
  if (bytes.length === 0) unusableFile({ file }, 'the file is empty');
  if (bytes.length > MOST_BYTES) {
    unusableFile(
      { file },
      `${Math.round(bytes.length / 1e6)} MB is more than the ${MOST_BYTES / 1e6} MB that are read`,
    );
  }
  const { encoding, note } = encodingOf(bytes);
  const raw = encoding === 'windows-1252' ? fromWindows1252(bytes) : strictly(bytes, encoding, file);
  const text = raw.replace(/^\ufeff/, '').replace(/\r\n?/g, '\n');
  requireText(text, file);
  return { text, encoding, note };
}

function encodingOf(bytes: Uint8Array): Omit<DecodedText, 'text'> {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return { encoding: 'utf-16le', note: null };
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return { encoding: 'utf-16be', note: null };
  const zeros = [0, 0];
  const looked = Math.min(bytes.length, 4096);
  for (let i = 0; i < looked; i += 1) if (bytes[i] === 0) zeros[i % 2]! += 1;
  if (zeros[1]! > looked * 0.3 && zeros[0] === 0) return { encoding: 'utf-16le', note: 'UTF-16 without its mark' };
  if (zeros[0]! > looked * 0.3 && zeros[1] === 0) return { encoding: 'utf-16be', note: 'UTF-16 without its mark' };
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    return { encoding: 'utf-8', note: null };
  } catch {
    return { encoding: 'windows-1252', note: 'not UTF-8: read as Windows-1252' };
  }
}

function strictly(bytes: Uint8Array, encoding: string, file: string): string {
  try {
    return new TextDecoder(encoding, { fatal: true }).decode(bytes);
  } catch {
    return unusableFile({ file }, `the file says it is ${encoding.toUpperCase()} and is not`);
  }
}

function fromWindows1252(bytes: Uint8Array): string {
  return Buffer.from(bytes)
    .toString('latin1')
    .replace(/[\u0080-\u009f]/g, (character) => WINDOWS_1252_HIGH[character.charCodeAt(0) - 0x80]!);
}

/** A control character means a picture, a spreadsheet's own file or a damaged one, never a table of text. */
function requireText(text: string, file: string): void {
  const at = text.search(/[\u0000-\u0008\u000e-\u001f]/);
  if (at !== -1) {
    const before = text.slice(0, at);
    const row = before.split('\n').length;
    const column = before.slice(before.lastIndexOf('\n') + 1).split(/[,;\t|]/).length;
    unusableFile({ file, row, column }, 'not text (a byte that no table holds): save the table as CSV and try again');
  }
  if (text.trim() === '') unusableFile({ file }, 'the file is empty');
}
