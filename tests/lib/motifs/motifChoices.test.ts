import { describe, expect, it } from 'vitest';
import { motifChoices } from '../../../src/lib/motifs/motifChoices';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';

describe('motifChoices', () => {
  it('names every ready-made motif, and how far each can be worked', () => {
    const choices = motifChoices();
    expect(choices[0]).toEqual({
      key: 'group-square',
      name: 'Classic group square',
      sides: 4,
      rounds: 8,
      version: null,
    });
    for (const { key, name, rounds } of choices) {
      const motif = readyMotif(key);
      expect([motif?.name, motif?.rounds.length]).toEqual([name, rounds]);
    }
  });
});
