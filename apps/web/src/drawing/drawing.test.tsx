import { ChakraProvider } from '@chakra-ui/react';
import { placeKey, placesOnCircuit } from '@lampwright/harness';
import { largeCases } from '@lampwright/harness/testing';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactElement } from 'react';
import { system } from '../theme/system';
import { HarnessDrawing, HarnessList, SuspicionBar, type DrawingMarks, type PlaceMark } from '.';

const { harness, circuit } = largeCases[0]!;
const plug = harness.parts.find((part) => part.kind === 'plug' && part.separable)!;

function marks(over: Partial<DrawingMarks> = {}): DrawingMarks {
  const places = new Map<string, PlaceMark>(
    placesOnCircuit(harness, circuit).map((place, at) => [
      placeKey(place.ref),
      at % 2 ? 'cleared' : 'inQuestion',
    ]),
  );
  return { cut: [], open: [], places, ...over };
}

function show(element: ReactElement) {
  return render(<ChakraProvider value={system}>{element}</ChakraProvider>);
}

describe('HarnessDrawing', () => {
  const base = { harness, circuit, lengths: 'feet' as const };

  it('says in words what it shows', () => {
    const others = harness.parts.filter((part) => part.separable && part.id !== plug.id);
    show(<HarnessDrawing {...base} marks={marks({ cut: [plug.id], open: [others[0]!.id] })} />);
    const picture = screen.getByRole('img', { name: new RegExp(`^Plan of ${harness.name}`) });
    expect(picture).toHaveAccessibleName(expect.stringContaining(`Part it at ${plug.label}.`));
    expect(picture).toHaveAccessibleName(
      expect.stringContaining(`Unplugged: ${others[0]!.label}.`),
    );
  });

  it('draws one cut with its flag, and none without', () => {
    const { container, rerender } = show(
      <HarnessDrawing {...base} marks={marks({ cut: [plug.id] })} />,
    );
    expect(container.querySelectorAll('[data-cut]')).toHaveLength(1);
    expect(container.querySelector('[data-flag]')).toHaveTextContent('Part it here:');
    rerender(
      <ChakraProvider value={system}>
        <HarnessDrawing {...base} marks={marks()} />
      </ChakraProvider>,
    );
    expect(container.querySelectorAll('[data-cut]')).toHaveLength(0);
  });

  it('gives every part that may be picked a button with its name, and no other', async () => {
    const onPick = vi.fn();
    show(
      <HarnessDrawing {...base} marks={marks()} onPick={onPick} pickable={new Set([plug.id])} />,
    );
    const button = screen.getByRole('button', { name: new RegExp(`^${plug.label}:`) });
    button.focus();
    await userEvent.keyboard('{Enter}');
    expect(onPick).toHaveBeenCalledExactlyOnceWith(plug.id);
    const other = harness.parts.find((part) => part.id !== plug.id && part.separable)!;
    expect(
      screen.queryByRole('button', { name: new RegExp(`^${other.label}:`) }),
    ).not.toBeInTheDocument();
  });

  it('has buttons for closer, further and the whole trailer', async () => {
    const { container } = show(<HarnessDrawing {...base} marks={marks()} />);
    const sheet = () => container.querySelector('.lw-sheet g')!.getAttribute('transform');
    const before = sheet();
    await userEvent.click(screen.getByRole('button', { name: 'Closer' }));
    expect(sheet()).not.toBe(before);
    await userEvent.click(screen.getByRole('button', { name: 'Whole trailer' }));
    expect(sheet()).toBe(before);
  });

  it('explains its signs on request', async () => {
    show(<HarnessDrawing {...base} marks={marks()} />);
    const key = screen.getByRole('button', { name: 'Key' });
    expect(screen.queryByText('Splice')).not.toBeVisible();
    await userEvent.click(key);
    expect(key).toHaveAttribute('aria-expanded', 'true');
    expect(screen.getByText('Splice')).toBeVisible();
  });

  it('keeps to the picture when compact', () => {
    show(<HarnessDrawing {...base} marks={marks()} compact />);
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
  });

  it('shows the results of a lamp check', () => {
    const lamp = harness.parts.find((part) => part.kind === 'lamp')!;
    const { container } = show(
      <HarnessDrawing {...base} marks={marks({ lamps: new Map([[lamp.id, 'dark']]) })} />,
    );
    expect(container.querySelectorAll('[data-result="dark"]')).toHaveLength(1);
  });
});

describe('HarnessList', () => {
  it('tells every part with its state under the part that feeds it', () => {
    show(<HarnessList harness={harness} circuit={circuit} marks={marks({ open: [plug.id] })} />);
    const list = screen.getByRole('list', { name: new RegExp(harness.name) });
    expect(within(list).getAllByRole('listitem')).toHaveLength(harness.parts.length);
    expect(within(list).getByText(/unplugged/)).toBeInTheDocument();
    expect(within(list).queryByRole('button')).not.toBeInTheDocument();
  });

  it('lets a part be picked by keyboard', async () => {
    const onPick = vi.fn();
    show(
      <HarnessList
        harness={harness}
        circuit={circuit}
        marks={marks()}
        onPick={onPick}
        pickable={new Set([plug.id])}
      />,
    );
    await userEvent.click(screen.getByRole('button', { name: new RegExp(plug.label) }));
    expect(onPick).toHaveBeenCalledExactlyOnceWith(plug.id);
  });
});

describe('SuspicionBar', () => {
  it('says what it shows', () => {
    show(
      <SuspicionBar
        slices={[
          { key: 'a', label: 'P3', probability: 0.5, state: 'inQuestion' },
          { key: 'b', label: 'P4', probability: 0.25, state: 'inQuestion' },
          { key: 'c', label: 'P5', probability: 0.25, state: 'cleared' },
        ]}
      />,
    );
    expect(screen.getByRole('img')).toHaveAccessibleName(
      'Of 3 places, 1 are cleared and 2 are in question. Most likely: P3, 50 percent.',
    );
  });
});
