/**
 * The parts of a line, separated by spaces, tabs or commas. Between spaces a single comma is a decimal mark, as in
 * `14,8 15,2`; without any space commas separate, as in `500,510`.
 *
 * @example readTokens('14.8, 15.2, 15.0') // → ['14.8', '15.2', '15.0']
 */
export function readTokens(line: string): string[] {
  const parts = line.split(/\s+/).filter((part) => part !== '');
  const alone = parts.length === 1;
  return parts.flatMap((part) => {
    const bare = part.replace(/^,+|,+$/g, '');
    const commas = bare.split(',').length - 1;
    const separates = commas > 1 || (commas === 1 && (alone || bare.includes('.')));
    return (separates ? bare.split(',') : [bare]).filter((token) => token !== '');
  });
}

/**
 * A token as a number where it is one, else as it stands, so that the schema can say what is wrong with it.
 *
 * @example readNumber('−1,5') // → −1.5
 */
export function readNumber(token: string): number | string {
  const plain = token.trim().replace('\u2212', '-').replace(',', '.');
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain) ? Number(plain) : token;
}
