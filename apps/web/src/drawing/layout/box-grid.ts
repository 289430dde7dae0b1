import { boxesOverlap, type Box } from './geometry';

const CELL = 48;

/** Boxes with something attached, found again by area; a query costs the cells it covers and what lies in them. */
export class BoxGrid<Item> {
  private readonly cells = new Map<string, { box: Box; item: Item }[]>();

  add(box: Box, item: Item): void {
    const entry = { box, item };
    for (const key of this.keys(box)) {
      const cell = this.cells.get(key);
      if (cell) cell.push(entry);
      else this.cells.set(key, [entry]);
    }
  }

  /** Everything whose box overlaps `box`, each once. A box without thickness overlaps what it passes through. */
  over(box: Box): Item[] {
    const found = new Set<{ box: Box; item: Item }>();
    for (const key of this.keys(box)) {
      for (const entry of this.cells.get(key) ?? []) {
        if (boxesOverlap(entry.box, box)) found.add(entry);
      }
    }
    return [...found].map((entry) => entry.item);
  }

  private *keys(box: Box): Generator<string> {
    const right = Math.floor((box.x + box.width) / CELL);
    const bottom = Math.floor((box.y + box.height) / CELL);
    for (let column = Math.floor(box.x / CELL); column <= right; column += 1) {
      for (let row = Math.floor(box.y / CELL); row <= bottom; row += 1) yield `${column} ${row}`;
    }
  }
}
