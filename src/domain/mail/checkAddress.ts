// Dots stand only between letters (RFC 5322 dot-atom): anything else would have to be quoted.
const MAILBOX =
  /^(?=.{1,64}@)[\w!#$%&'*+/=?^`{|}~-]+(\.[\w!#$%&'*+/=?^`{|}~-]+)*@[a-z\d]([a-z\d-]*[a-z\d])?(\.[a-z\d]([a-z\d-]*[a-z\d])?)*$/i;

/**
 * An address that may stand in an envelope: one mailbox, plain letters, nothing that a server could read as two
 * addresses, a header or a command.
 *
 * @throws {RangeError} saying what is wrong, never the address
 */
export function checkAddress(address: string): string {
  if (/[\r\n\0]/.test(address)) throw new RangeError('address holds a line break');
  const plain = address.normalize('NFKC');
  // A letter that becomes another on the way, an @ among them, is somebody else's address.
  if (plain !== address || !/^[\x21-\x7e]+$/.test(plain)) throw new RangeError('address holds letters beyond ASCII');
  if (address.length > 254 || !MAILBOX.test(address)) {
    throw new RangeError('address is not one plain mailbox');
  }
  return address;
}

/**
 * A line of a header.
 *
 * @throws {RangeError}
 */
export function checkHeaderLine(line: string): string {
  if (/[\r\n\0]/.test(line)) throw new RangeError('header holds a line break');
  return line;
}
