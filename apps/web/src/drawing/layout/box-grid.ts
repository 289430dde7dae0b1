import { boxesOverlap, type Box } from './geometry';

const CELL = 48;
/** More rows of cells than any sheet has. */
const ROWS = 10_000;

interface Entry<Item> {
  box: Box;
  item: Item;
  /** The last query that met it, so that one that lies in several cells is told once. */
  met: number;
}

/** Boxes with something attached, found again by area; a query costs the cells it covers and what lies in them. */
export class BoxGrid<Item> {
  private readonly cells = new Map<number, Entry<Item>[]>();
  private queries = 0;

  add(box: Box, item: Item): void {
    const entry = { box, item, met: 0 };
    for (const key of keysOf(box)) {
      const cell = this.cells.get(key);
      if (cell) cell.push(entry);
      else this.cells.set(key, [entry]);
    }
  }

  /** Everything whose box overlaps `box`, each once. A box without thickness overlaps what it passes through. */
  over(box: Box): Item[] {
    this.queries += 1;
    const found: Item[] = [];
    for (const key of keysOf(box)) {
      for (const entry of this.cells.get(key) ?? []) {
        if (entry.met === this.queries || !boxesOverlap(entry.box, box)) continue;
        entry.met = this.queries;
        found.push(entry.item);
      }
    }
    return found;
  }
}

function keysOf(box: Box): number[] {
  const keys: number[] = [];
  const right = Math.floor((box.x + box.width) / CELL);
  const bottom = Math.floor((box.y + box.height) / CELL);
  for (let column = Math.floor(box.x / CELL); column <= right; column += 1) {
    for (let row = Math.floor(box.y / CELL); row <= bottom; row += 1)
      keys.push(column * ROWS + row);
  }
  return keys;
}
