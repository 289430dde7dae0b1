/** Beyond this many letters a label is also offered on two lines. */
const LONG = 9;

/** A plan's short name for a part: a leading code such as "P3" or "LH12"; else `null`. */
export function shortName(label: string): string | null {
  return /^[\p{Lu}]{1,3}-?\d{1,3}[a-z]?(?=\s|$)/u.exec(label)?.[0] ?? null;
}

/** A label without the clause after its last comma, which in practice names the side that the drawing shows anyway. */
export function shortLabel(label: string): string {
  return label.replace(/,[^,]*$/, '');
}

/** The ways a label may be written, best first: short; on two lines; by its code, or by its number in the list. */
export function labelVariants(label: string, number: number): string[][] {
  const short = shortLabel(label);
  const code = shortName(label);
  const variants = [[short]];
  const halves = short.length > LONG ? twoLines(short) : null;
  if (halves) variants.push(halves);
  if (code !== short) variants.push([code ?? String(number)]);
  return variants;
}

/** Breaks at the space that leaves the shorter longest line. */
function twoLines(label: string): string[] | null {
  const words = label.split(/\s+/);
  let best: string[] | null = null;
  for (let at = 1; at < words.length; at += 1) {
    const lines = [words.slice(0, at).join(' '), words.slice(at).join(' ')];
    const longest = (of: string[]) => Math.max(...of.map((line) => line.length));
    if (!best || longest(lines) < longest(best)) best = lines;
  }
  return best;
}
