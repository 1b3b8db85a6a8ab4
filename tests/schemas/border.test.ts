import { describe, expect, it } from 'vitest';
import { readyEdging } from '../../src/lib/border/readyEdgings';
import { EXAMPLE_PLAN } from '../../src/lib/plan/examplePlan';
import { borderRoundSchema } from '../../src/schemas/border';
import { planSchema } from '../../src/schemas/plan';

const shells = { stitch: 'dc', colour: 'c1', edging: readyEdging('shell') };
const messageOf = (round: object): string | undefined =>
  borderRoundSchema.safeParse(round).error?.issues[0]?.message;

describe('borderRoundSchema', () => {
  it('takes plain rounds as plans have always had them, and edgings', () => {
    expect(borderRoundSchema.parse({ stitch: 'sc', colour: 'c1' })).toEqual({
      stitch: 'sc',
      colour: 'c1',
    });
    const adjusted = { stitch: 'sc', colour: 'c1', adjust: [2, -1, 2, -1] };
    const border = [adjusted, shells];
    expect(planSchema.parse({ ...EXAMPLE_PLAN, border }).border).toEqual(border);
  });

  it('says what is wrong with an edging', () => {
    const { edging } = shells;
    expect(messageOf({ ...shells, edging: { ...edging, text: ' ' } })).toBe(
      'Text of the edging is missing',
    );
    expect(messageOf({ ...shells, edging: { ...edging, text: 'x'.repeat(2001) } })).toBe(
      'Text of the edging must have at most 2,000 characters',
    );
    expect(messageOf({ ...shells, edging: { ...edging, over: { least: 6, multipleOf: 0 } } })).toBe(
      'Stitches of a repeat must be at least 1',
    );
    expect(messageOf({ ...shells, edging: { ...edging, colour: 'c1' } })).toBe(
      'Edging has no field named colour',
    );
  });

  it('takes no adjustment of other than four sides, nor beyond all measure', () => {
    const sc = { stitch: 'sc', colour: 'c1' };
    expect(messageOf({ ...sc, adjust: [1, 2] })).toBeDefined();
    expect(messageOf({ ...sc, adjust: [0, 0, 0, 501] })).toBe(
      'Stitches more on a side must be at most 500',
    );
  });
});
