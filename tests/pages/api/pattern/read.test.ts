import { describe, expect, it } from 'vitest';
import { POST } from '../../../../src/pages/api/pattern/read';
import { patternReadingSchema } from '../../../../src/schemas/pattern';
import { PATTERN_EXAMPLE, STITCH_EXAMPLE } from '../../../../src/server/examples';
import { callRoute } from '../../../support/callRoute';
import { expectFieldErrors } from '../../../support/refusals';

const read = (body: object) => callRoute(POST, { method: 'POST', body });

describe('POST /api/pattern/read', () => {
  it('answers a stranger with what each round makes, counts and leaves as spaces', async () => {
    const { status, json } = await read(PATTERN_EXAMPLE);
    expect(status).toBe(200);
    // Worked by hand: 4 groups of 3 dc, the first dc of them ch 3; ch 2 after each; one sl st to join.
    expect(json).toEqual({
      rounds: [
        {
          label: 'Rnd 1',
          made: { ch: 3 + 4 * 2, dc: 4 * 3 - 1, 'sl st': 1 },
          tally: { dc: 12 },
          spaces: { 'ch-2': 4 },
          perSide: 3,
        },
      ],
      diagnostics: [],
    });
    expect(patternReadingSchema.parse(json)).toEqual(json);
  });

  it('counts UK terms by their US abbreviation', async () => {
    const text =
      'Rnd 1: 3 ch (counts as tr), 11 tr in magic ring; ss in top of 3 ch to join. (12 tr)';
    const { json } = await read({ text, terms: 'uk', sides: 0 });
    expect(json.rounds[0]).toMatchObject({
      made: { ch: 3, dc: 11, 'sl st': 1 },
      tally: { dc: 12 },
    });
    expect(json.diagnostics).toEqual([]);
  });

  it('reads stitches of one’s own by their moves, and the size asked for', async () => {
    const text = 'Rnd 1: Ch 3 (counts as dc), 10 (12) lst in magic ring; join. (1 dc, 10 (12) lst)';
    const { json } = await read({
      ...{ text, terms: 'us', sides: 0, size: 1 },
      stitches: [STITCH_EXAMPLE],
    });
    expect(json.diagnostics).toEqual([]);
    expect(json.rounds[0]).toMatchObject({
      made: { ch: 3, lst: 12, 'sl st': 1 },
      tally: { dc: 1, lst: 12 },
    });
  });

  it('says what is wrong and where, and what would put it right', async () => {
    const text =
      'Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join.\nRnd 2: Ch 1, 2 scc in each dc around; join. (23 sc)';
    const { json } = await read({ text, terms: 'us', sides: 0 });
    expect(json.diagnostics[0]).toEqual({
      code: 'unknown-word',
      severity: 'error',
      line: 2,
      column: 'Rnd 2: Ch 1, 2 '.length + 1,
      message: expect.stringContaining('"sc"'),
      fix: {
        label: 'Write "sc"',
        begin: text.indexOf('scc'),
        end: text.indexOf('scc') + 3,
        replacement: 'sc',
      },
    });
  });

  it('answers a program that sends no Origin', async () => {
    const headers = { origin: null };
    const { status } = await callRoute(POST, { method: 'POST', body: PATTERN_EXAMPLE, headers });
    expect(status).toBe(200);
  });

  it('says what is wrong beside each field', async () => {
    await expectFieldErrors(POST, { method: 'POST', body: PATTERN_EXAMPLE }, [
      { change: { text: undefined }, fields: { text: 'Pattern text is missing' } },
      { change: { text: 7 }, fields: { text: 'Pattern text must be text' } },
      {
        change: { text: 'x'.repeat(50_001) },
        fields: { text: 'Pattern text must have at most 50,000 characters' },
      },
      { change: { terms: 'fr' }, fields: { terms: 'Terms must be one of us, uk' } },
      { change: { sides: 5 }, fields: { sides: 'Sides of a motif must be one of 0, 3, 4, 6, 8' } },
      {
        change: { sides: '4' },
        fields: { sides: 'Sides of a motif must be one of 0, 3, 4, 6, 8' },
      },
      { change: { size: 20 }, fields: { size: 'Size must be at most 19' } },
      { change: { stitches: 'lst' }, fields: { stitches: 'Own stitches must be a list' } },
      {
        change: { stitches: [STITCH_EXAMPLE, STITCH_EXAMPLE] },
        fields: { stitches: 'Own stitches must each have an abbreviation of their own' },
      },
      {
        change: { stitches: [{ ...STITCH_EXAMPLE, abbreviation: 'L' }] },
        fields: {
          'stitches.0.abbreviation': 'Abbreviation must be two or more small letters, such as lst',
        },
      },
      { change: { hook: 4 }, fields: { '': 'Pattern has no field named hook' } },
    ]);
  });

  it.each([
    '',
    'no pattern at all',
    '* * * ( [ rep from',
    '\u{1f9f6}'.repeat(1_000),
    'Rnd 1: ['.repeat(5_000),
  ])('answers %.20s with what is wrong, not with a failure', async (text) => {
    const { status, json } = await read({ text, terms: 'us', sides: 4 });
    expect(status).toBe(200);
    expect(json.diagnostics.length).toBeGreaterThan(0);
  });
});
