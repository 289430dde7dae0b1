import { arbitraryHarness, largeCases } from '@lampwright/harness/testing';
import type { Harness } from '@lampwright/harness';
import fc from 'fast-check';
import { labelRequests } from '../label-requests';
import { labelSurroundings, symbolBoxes } from '../label-surroundings';
import type { DrawingMarks } from '../marks';
import { boxesOverlap, boxInside, type Box } from './geometry';
import { layoutHarness } from './layout-harness';
import { placeLabels, type LabelRequest } from './place-labels';

function request(
  id: string,
  x: number,
  y: number,
  priority: number,
  text = 'Rear marker',
): LabelRequest {
  return {
    id,
    at: { x, y },
    reach: 10,
    variants: [[text], ['7']],
    priority,
    bold: false,
    mayLead: true,
  };
}

const open: DrawingMarks = { cut: [], open: [], places: new Map() };
const sheet = { x: 0, y: 0, width: 400, height: 300 };

function labelled(harness: Harness, circuit: string | null, scale: number) {
  const layout = layoutHarness({
    harness,
    circuit,
    keep: new Set(),
    sheet: { width: 720, height: 500 },
    compact: false,
  });
  const ink = 1 / Math.sqrt(scale);
  const requests = labelRequests({
    parts: layout.parts,
    positions: layout.positions,
    reach: (layout.symbol * ink) / 2,
    marks: open,
    pickable: () => false,
    flagged: new Set(),
    few: false,
    near: scale > 1,
    wording: (part) => part.label,
  });
  const around = labelSurroundings({
    layout,
    marks: open,
    texts: [],
    flags: [],
    ink,
    dimensionY: null,
  });
  const labels = placeLabels(requests, { ...around, size: 14 / scale });
  return { labels, symbols: symbolBoxes(layout, ink), around };
}

function expectReadable(boxes: readonly Box[], symbols: readonly Box[], inside: Box) {
  boxes.forEach((box, at) => {
    expect(boxInside(box, inside)).toBe(true);
    for (const symbol of symbols) expect(boxesOverlap(box, symbol)).toBe(false);
    for (const other of boxes.slice(at + 1)) expect(boxesOverlap(box, other)).toBe(false);
  });
}

describe('placeLabels', () => {
  it('lets no label cover another, a symbol or the edge of the sheet', () => {
    fc.assert(
      fc.property(
        arbitraryHarness({ maxParts: 50 }),
        fc.constantFrom(1, 2.5, 6),
        (harness, scale) => {
          const { labels, symbols, around } = labelled(harness, null, scale);
          expectReadable(
            labels.map((label) => label.box),
            symbols,
            around.sheet,
          );
        },
      ),
      { numRuns: 50 },
    );
  });

  it('writes more labels the nearer one looks', () => {
    const { harness, circuit } = largeCases.at(-1)!;
    const written = (scale: number) =>
      labelled(harness, circuit, scale).labels.filter((label) =>
        /[a-z]/i.test(label.lines.join('')),
      ).length;
    expect(written(4)).toBeGreaterThan(written(1));
  });

  it('serves the higher priority first', () => {
    const surroundings = {
      sheet: { x: 0, y: 0, width: 90, height: 52 },
      solid: [],
      soft: [],
      size: 14,
    };
    const rivals = [request('late', 45, 32, 5), request('early', 45, 32, 0)];
    const labels = placeLabels(rivals, surroundings);
    expect(labels[0]).toMatchObject({ id: 'early', lines: ['Rear marker'] });
    expect(labels.find((label) => label.id === 'late')?.lines).not.toEqual(['Rear marker']);
  });

  it('writes the number where the name does not fit', () => {
    const labels = placeLabels([request('a', 15, 15, 0, 'A very long name indeed')], {
      sheet: { x: 0, y: 0, width: 60, height: 60 },
      solid: [],
      soft: [],
      size: 14,
    });
    expect(labels.map((label) => label.lines)).toEqual([['7']]);
  });

  it('prefers a position off a wire', () => {
    const above = { box: { x: 100, y: 100, width: 200, height: 30 }, cost: 3 };
    const [label] = placeLabels([request('a', 200, 150, 0)], {
      sheet,
      solid: [],
      soft: [above],
      size: 14,
    });
    expect(boxesOverlap(label!.box, above.box)).toBe(false);
  });
});
