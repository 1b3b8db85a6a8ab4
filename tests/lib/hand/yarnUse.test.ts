import { describe, expect, it } from 'vitest';
import { addUse, NO_YARN, useOfStitches } from '../../../src/lib/hand/yarnUse';
import { frozen } from '../../support/plans';

describe('useOfStitches', () => {
  it('turns stitches into loops, without seams or tails', () => {
    const use = useOfStitches(frozen({ sc: 10, ch: 4 }));
    expect([...use.loops]).toEqual([
      ['sc', 20],
      ['ch', 4],
    ]);
    expect(use).toMatchObject({ seamM: 0, cutM: 0 });
  });
});

describe('addUse', () => {
  it('adds a use several times over and changes neither', () => {
    const left = frozen({ loops: new Map([['sc', 2]]), seamM: 1, cutM: 0.5 });
    const right = frozen({
      loops: new Map([
        ['sc', 3],
        ['ch', 1],
      ]),
      seamM: 2,
      cutM: 0.25,
    });
    const sum = addUse(left, right, 4);
    expect([...sum.loops]).toEqual([
      ['sc', 14],
      ['ch', 4],
    ]);
    expect(sum).toMatchObject({ seamM: 9, cutM: 1.5 });
    expect([...left.loops]).toEqual([['sc', 2]]);
    expect(right.loops.size).toBe(2);
  });

  it('leaves no yarn where there was none', () => {
    expect(addUse(NO_YARN, NO_YARN, 7)).toEqual(NO_YARN);
    expect(NO_YARN.loops.size).toBe(0);
  });
});
