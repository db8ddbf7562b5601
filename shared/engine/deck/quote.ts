const LONGEST_SHOWN = 32;

/** A piece of the deck as shown in a message: short, and on one line whatever it holds. */
export function quote(text: string): string {
  const shown = text.length > LONGEST_SHOWN ? `${text.slice(0, LONGEST_SHOWN)}…` : text;
  return `"${shown.replace(/[^\x20-\x7e…]/g, '?')}"`;
}
