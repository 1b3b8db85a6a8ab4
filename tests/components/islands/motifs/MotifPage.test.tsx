import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { MotifPage } from '../../../../src/components/islands/motifs/MotifPage';
import { widthMm } from '../../../../src/lib/units/quantities';
import type { PresentedMotif } from '../../../../src/schemas/motif';
import { presentReadyMotif } from '../../../../src/server/presenters/motif';
import { stubWidth } from '../../resizeObserver';

beforeEach(() => stubWidth(400));
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const ready = (key: string) => presentReadyMotif(key) as PresentedMotif;
const swatch = {
  id: '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41',
  name: 'Mine',
  weightCategory: null,
  swatch: {
    stitch: 'sc',
    stitches: 20,
    rows: 18,
    widthMm: widthMm(150),
    heightMm: widthMm(124),
  },
};
const show = (presented = ready('group-square'), terms: 'us' | 'uk' = 'us') =>
  render(
    <MotifPage
      {...{ presented, terms }}
      versions={[]}
      stitches={[]}
      made={[]}
      signedIn
      swatches={[swatch]}
      units="metric"
    />,
  );
const choose = (label: string, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
const rows = () =>
  within(screen.getByRole('region', { name: 'Table of rounds' })).getAllByRole('row', {
    name: /^Rnd/,
  });

describe('MotifPage', () => {
  it('has a row for every round it is worked to', () => {
    show();
    expect(rows()).toHaveLength(4);
    choose('Worked to', '6');
    expect(rows()).toHaveLength(6);
  });

  it('counts as the trade does: 12, 24, 36 and 48 dc in a group square', () => {
    // Common practice: rounds of 3-dc groups in a square hold 12 k dc (published count 6k(k+1) in all).
    show();
    const counted = rows().map((row) =>
      within(row).getAllByRole('cell')[1]?.textContent?.replace('\u00a0', ' '),
    );
    expect(counted).toEqual(['12 dc', '24 dc', '36 dc', '48 dc']);
  });

  it("takes one's own swatch first, and any yarn weight instead", () => {
    show();
    const own = screen.getByText('A square of 4 rounds comes out').nextElementSibling?.textContent;
    choose('At the gauge of', 'weight-6');
    expect(
      screen.getByText('A square of 4 rounds comes out').nextElementSibling?.textContent,
    ).not.toBe(own);
  });

  it('says which joins fit, and for the others why not', () => {
    show(ready('circle-in-square'));
    expect(screen.getByRole('heading', { name: 'Whip stitch fits' })).toBeTruthy();
    const refused = screen.getByRole('heading', { name: 'Reed lace does not fit' });
    expect(refused.nextElementSibling?.textContent).toMatch(/^12 stitches a side do not fit/);
  });

  it('names the stitch that would help in UK terms', () => {
    show(ready('circle-in-square'), 'uk');
    expect(screen.queryByText(/rounds of sc/i)).toBeNull();
  });
});
