import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { PatternEditor } from '../../../../src/components/islands/pattern/PatternEditor';
import type { PatternDraft } from '../../../../src/components/islands/pattern/usePatternDraft';
import type { MotifSides } from '../../../../src/lib';
import { stubWidth } from '../../resizeObserver';

// The editor fetches its chart; fetched once here, it is there at once in every test.
beforeAll(() => import('../../../../src/components/chart/SymbolChart'));
beforeEach(() => stubWidth(400));
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const RIGHT = `Ch 4, join with sl st to form ring.
Rnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, *3 dc in ring, ch 2; rep from * 2 more times; join with sl st in top of beg ch-3. (12 dc, 4 ch-2 sps)`;

function Editor({ text, sides = 4 }: { text: string; sides?: MotifSides }) {
  const [pattern, setPattern] = useState<PatternDraft>({
    name: 'Mine',
    text,
    terms: 'us',
    sides,
    size: 0,
  });
  return (
    <PatternEditor
      pattern={pattern}
      onChange={(change) => setPattern((old) => ({ ...old, ...change }))}
      units="metric"
      shownTerms="us"
      swatches={[]}
    />
  );
}
const field = () => screen.getByLabelText<HTMLTextAreaElement>('Pattern text');
const type = (text: string) => fireEvent.change(field(), { target: { value: text } });
const table = () => screen.getByRole('region', { name: 'Table of rounds' });

describe('PatternEditor', () => {
  it('counts a classic first round as it is read', () => {
    // published: the first round of a group square makes 11 ch, 11 dc, 1 sl st and counts 12 dc.
    render(<Editor text={RIGHT} />);
    const [, first] = within(table()).getAllByRole('row');
    const cells = within(first as HTMLElement).getAllByRole('cell');
    const words = cells.map((cell) => cell.textContent?.replaceAll('\u00a0', ' '));
    expect(words.slice(0, 5)).toEqual([
      '1 sl st, 11 ch, 11 dc',
      '12 dc',
      '12 dc, 4 ch-2 sps',
      '4 ch-2',
      '3',
    ]);
    expect(screen.getByRole('heading', { name: 'Reads without a problem' })).toBeTruthy();
  });

  it('names every problem with its line and column, and underlines each', () => {
    const { container } = render(<Editor text="" />);
    type(RIGHT.replace('2 dc in ring', '2 dcc in ring').replace('12 dc, 4', '13 dc, 4'));
    // "Rnd 1: Ch 3 (counts as dc), 2 " is 30 characters long.
    expect(screen.getByRole('button', { name: 'line 2, column 31' })).toBeTruthy();
    const said = screen
      .getAllByRole('listitem')
      .filter((item) => /line \d+/.test(item.textContent ?? ''));
    expect(said.length).toBeGreaterThanOrEqual(2);
    const underlined = [...container.querySelectorAll('[data-begin].underline')];
    expect(underlined.map((piece) => piece.textContent).join('|')).toContain('dcc');
  });

  it('puts a problem right with one click', () => {
    render(<Editor text={RIGHT.replace('2 dc in ring', '2 dcc in ring')} />);
    fireEvent.click(screen.getByRole('button', { name: 'Write "dc"' }));
    expect(field().value).toBe(RIGHT);
    expect(screen.getByRole('heading', { name: 'Reads without a problem' })).toBeTruthy();
  });

  it('lights the text of the stitch that the chart points at', async () => {
    const { container } = render(<Editor text={RIGHT} />);
    const chart = await screen.findByRole('group', { name: /^Chart of Mine, 1 rounds/ });
    fireEvent.keyDown(chart, { key: 'ArrowLeft' });
    const lit = () => container.querySelector('[data-begin].outline')?.textContent;
    expect(lit()).toBe('Ch 3 (counts as dc)');
    for (let i = 0; i < 3; i += 1) fireEvent.keyDown(chart, { key: 'ArrowLeft' });
    expect(lit()).toBe('2 dc in ring');
    expect(screen.getByText('Rnd 1, 4 of 23: dc in the ring, side 1')).toBeTruthy();
  });

  it('marks in the chart what the cursor stands in', async () => {
    const { container } = render(<Editor text={RIGHT} />);
    await screen.findByRole('group', { name: /^Chart of/ });
    const mark = () => container.querySelector('path.stroke-amber')?.getAttribute('d');
    expect(mark()).toBe('');
    const at = RIGHT.indexOf('2 dc in ring') + 3;
    field().setSelectionRange(at, at);
    fireEvent.select(field());
    // Two dc, each a stem, a cap and a stroke.
    expect(mark()?.match(/M/g)).toHaveLength(6);
  });

  it('rewrites the text in the other terms without changing what it makes', () => {
    render(<Editor text={RIGHT} />);
    const before = within(table())
      .getAllByRole('cell')
      .map((cell) => cell.textContent);
    fireEvent.click(screen.getByRole('button', { name: 'Rewrite in UK terms' }));
    expect(field().value).toContain('2 tr in ring');
    expect(
      within(table())
        .getAllByRole('cell')
        .map((cell) => cell.textContent),
    ).toEqual(before);
  });

  it('offers the sizes that a pattern is written for', () => {
    render(
      <Editor
        sides={0}
        text={
          'Ch 11 (13, 15).\nRow 1: Sc in 2nd ch from hook and in each ch across. (10 (12, 14) sc)'
        }
      />,
    );
    const counted = () =>
      within(table()).getAllByRole('cell')[1]?.textContent?.replace('\u00a0', ' ');
    expect(counted()).toBe('10 sc');
    fireEvent.change(screen.getByLabelText('Size'), { target: { value: '2' } });
    expect(counted()).toBe('14 sc');
  });

  it('prints a clean page in full words', () => {
    render(<Editor text={RIGHT} />);
    fireEvent.click(screen.getByRole('radio', { name: 'Full words' }));
    const page = screen.getByRole('region', { name: 'Clean pattern page' });
    expect(page.textContent).toContain('2 double crochet in ring');
  });
});
