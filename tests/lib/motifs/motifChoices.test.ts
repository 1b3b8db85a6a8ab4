import { describe, expect, it } from 'vitest';
import { motifChoices } from '../../../src/lib/motifs/motifChoices';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';

describe('motifChoices', () => {
  it('names the motifs that a blanket can be laid out of, and how far each can be worked', () => {
    const choices = motifChoices();
    expect(choices[0]).toEqual({
      key: 'group-square',
      name: 'Classic group square',
      rounds: 8,
      version: null,
    });
    for (const { key, name, rounds } of choices) {
      const motif = readyMotif(key);
      expect([motif?.name, motif?.rounds.length]).toEqual([name, rounds]);
    }
    // Triangles and octagons have no layout yet.
    expect(choices.map(({ key }) => readyMotif(key)?.sides)).not.toContain(3);
    expect(choices.map(({ key }) => readyMotif(key)?.sides)).not.toContain(8);
  });
});
