/** How wide a text of a size is, roughly: for choosing a label or a line's end, never for placing one. */
export const textWidth = (text: string, font: number): number => text.length * font * 0.52;

/**
 * Breaks a name into lines that fit; a word longer than the room stands alone on its line.
 *
 * @example wrapWords('Countermovement jump', 100, 15) // → ['Countermovement', 'jump']
 */
export function wrapWords(text: string, room: number, font: number): string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const longer = lines.length > 0 ? `${lines.at(-1)} ${word}` : word;
    if (lines.length > 0 && textWidth(longer, font) <= room) lines[lines.length - 1] = longer;
    else lines.push(word);
  }
  return lines;
}
