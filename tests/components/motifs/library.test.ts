import { describe, expect, it } from 'vitest';
import { inLibrary, libraryItem } from '../../../src/components/motifs/library';
import { gaugeOf, READY_MOTIFS } from '../../../src/lib';
import type { MotifSummary } from '../../../src/schemas/motif';
import { libraryQuery } from '../../../src/schemas/motifLibrary';
import { presentReadyMotif } from '../../../src/server/presenters/motif';

const unfinished: MotifSummary = {
  key: '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41',
  readyMade: false,
  version: 1,
  updatedAt: '2026-12-01T10:00:00.000Z',
  name: 'Winch',
  sides: 6,
  motif: null,
  problems: { errors: 2, warnings: 0 },
};
const items = [...READY_MOTIFS.flatMap(({ key }) => presentReadyMotif(key) ?? []), unfinished].map(
  (summary) => libraryItem(summary, gaugeOf(null, 4)),
);
const found = (search: Record<string, string>) =>
  inLibrary(items, libraryQuery.parse(search)).map(({ summary }) => summary.name);

describe('the library of motifs', () => {
  it('holds all of them, as shelved, when nothing is asked', () => {
    expect(found({})).toEqual(items.map(({ summary }) => summary.name));
  });

  it('finds by shape, also what has no round yet', () => {
    expect(found({ sides: '3' })).toEqual(['Solid triangle']);
    expect(found({ sides: '6' })).toContain('Winch');
    expect(found({ sides: '6' })).toHaveLength(5);
  });

  it('leaves "any" open: an empty choice is no circle', () => {
    expect(found({ sides: '', kind: '', join: '', name: '' })).toHaveLength(items.length);
  });

  it('finds by a part of the name, in any letters', () => {
    expect(found({ name: 'HEXA' })).toHaveLength(4);
  });

  it('finds by fabric and by the join that fits', () => {
    expect(found({ kind: 'textured' })).toEqual([
      'Cluster square',
      'Popcorn square',
      'Ridged square',
      'Popcorn hexagon',
    ]);
    // Reed lace needs 3 more than a multiple of 4: a square of 15 has it, a hexagon of 8 does not.
    expect(found({ join: 'reed-lace' })).toContain('Solid dc square');
    expect(found({ join: 'reed-lace' })).not.toContain('Solid hexagon');
  });

  it('orders by yarn', () => {
    const yarn = inLibrary(items, libraryQuery.parse({ order: 'yarn' })).map(
      ({ shown }) => shown?.yarnM ?? 0,
    );
    expect([...yarn].sort((a, b) => a - b)).toEqual(yarn);
  });

  it.each(['sides=5', 'kind=fluffy', 'join=no-such', 'order=luck'])(
    'leaves open what cannot be read: %s',
    (search) => {
      expect(found(Object.fromEntries(new URLSearchParams(search)))).toHaveLength(items.length);
    },
  );
});
