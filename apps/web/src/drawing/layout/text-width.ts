const NARROW = /[iljtfrI1.,:;'’|!()\s·-]/;
const WIDE = /[mwMW@%–—]/;
const CAPITAL = /[A-Z0-9]/;

/**
 * The width of a text in the product's typeface, estimated a little on the wide side so that the layout needs no
 * document and does not move when the font arrives. Same unit as `size`.
 */
export function textWidth(text: string, size: number, bold = false): number {
  let ems = 0;
  for (const sign of text) {
    if (NARROW.test(sign)) ems += 0.31;
    else if (WIDE.test(sign)) ems += 0.83;
    else if (CAPITAL.test(sign)) ems += 0.58;
    else ems += 0.52;
  }
  return ems * size * (bold ? 1.07 : 1);
}
