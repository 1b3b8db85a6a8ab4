import { describe, expect, it } from 'vitest';
import { tokenize } from '../../../../src/lib';
import { lexiconOf } from '../../../../src/lib/pattern/terms/lexicon';
import { readStitch } from '../../../../src/lib/pattern/terms/readStitch';
import { stitch } from '../../../../src/lib/stitches/stitchTable';

const read = (text: string, terms: 'us' | 'uk' = 'us') =>
  readStitch(tokenize(text), 0, lexiconOf(terms));
const code = (text: string, terms: 'us' | 'uk' = 'us') => read(text, terms)?.code ?? null;

// Published: the master list of abbreviations and its US and UK names, one step apart.
const US: [string, string][] = [
  ['ch', 'ch'],
  ['chains', 'ch'],
  ['sl st', 'sl st'],
  ['sl. st', 'sl st'],
  ['slip stitch', 'sl st'],
  ['sc', 'sc'],
  ['Single Crochet', 'sc'],
  ['hdc', 'hdc'],
  ['half double crochet', 'hdc'],
  ['half-double crochet', 'hdc'],
  ['DC', 'dc'],
  ['double crochet', 'dc'],
  ['tr', 'tr'],
  ['trc', 'tr'],
  ['triple crochet', 'tr'],
  ['dtr', 'dtr'],
  ['double treble', 'dtr'],
  ['trtr', 'trtr'],
  ['esc', 'esc'],
  ['ehdc', 'ehdc'],
  ['edc', 'edc'],
  ['etr', 'etr'],
  ['FPdc', 'FPdc'],
  ['fp dc', 'FPdc'],
  ['front post double crochet', 'FPdc'],
  ['BPsc', 'BPsc'],
  ['BPhdc', 'BPhdc'],
  ['BPtr', 'BPtr'],
  ['BPdtr', 'BPdtr'],
  ['BLO sc', 'BLsc'],
  ['FLdc', 'FLdc'],
  ['back loop only dc', 'BLdc'],
  ['sc2tog', 'sc2tog'],
  ['hdc2tog', 'hdc2tog'],
  ['dc 3 tog', 'dc3tog'],
  ['tr2tog', 'tr2tog'],
  ['dec', 'sc2tog'],
  ['dc3cl', 'dc3cl'],
  ['3-dc cl', 'dc3cl'],
  ['4 dc cluster', 'dc4cl'],
  ['CL', 'dc3cl'],
  ['bo', 'dc5cl'],
  ['bobble', 'dc5cl'],
  ['pc', '5-dc pc'],
  ['4-dc popcorn', '4-dc pc'],
  ['puff', '3-hdc puff'],
  ['ps', '3-hdc puff'],
  ['4-hdc puff st', '4-hdc puff'],
  ['picot', 'picot-3'],
  ['ch-4 picot', 'picot-4'],
];

const UK: [string, string][] = [
  ['ss', 'sl st'],
  ['dc', 'sc'],
  ['double crochet', 'sc'],
  ['htr', 'hdc'],
  ['half treble', 'hdc'],
  ['tr', 'dc'],
  ['treble crochet', 'dc'],
  ['dtr', 'tr'],
  ['double treble', 'tr'],
  ['trtr', 'dtr'],
  ['triple treble', 'dtr'],
  ['qtr', 'trtr'],
  ['quadruple treble', 'trtr'],
  ['edc', 'esc'],
  ['etr', 'edc'],
  ['FPtr', 'FPdc'],
  ['tr3tog', 'dc3tog'],
  ['5-tr pc', '5-dc pc'],
  ['dc2tog', 'sc2tog'],
];

describe('readStitch', () => {
  it.each(US)('reads "%s" as %s in US terms', (text, expected) => {
    expect(code(text)).toBe(expected);
    expect(stitch(expected)).not.toBeNull();
  });

  it.each(UK)('reads "%s" as US %s in UK terms', (text, expected) =>
    expect(code(text, 'uk')).toBe(expected),
  );

  it('tells a word of the other terms, and reads it as what it is', () => {
    expect(read('htr')).toMatchObject({ code: 'hdc', foreign: 0 });
    expect(read('sc', 'uk')).toMatchObject({ code: 'sc', foreign: 0 });
    expect(read('dc')).toMatchObject({ foreign: null });
  });

  it('knows how many go into one place and how many one takes up', () => {
    expect(read('inc')).toMatchObject({ code: 'sc', perPlace: 2, takes: 1 });
    expect(read('dc inc')).toMatchObject({ code: 'dc', perPlace: 2 });
    expect(read('7-dc shell')).toMatchObject({ code: 'dc', perPlace: 7 });
    expect(read('dc3tog')).toMatchObject({ takes: 3 });
    expect(read('dc3cl')).toMatchObject({ takes: 1 });
  });

  it('reads no further than the stitch', () => {
    expect(read('half double crochet in next st')?.next).toBe(3);
    expect(read('5-dc pc, ch 1')?.next).toBe(4);
  });

  it.each(['', 'xyz', 'around', 'half', 'double', '3', '3-ch', 'dc99tog', '5-dc', 'tog', '('])(
    'finds no stitch in "%s"',
    (text) => expect(read(text)).toBeNull(),
  );

  it('knows stitches of one\u2019s own by their abbreviation', () => {
    const moves = { wraps: 2, draws: 2, throughs: 3 };
    const rest = { heightOverWidth: null, takes: 2, symbol: null };
    const own = { abbreviation: 'lst', name: 'linked stitch', moves, ...rest };
    const lexicon = lexiconOf('us', [own]);
    const code = 'lst{2,2,3}';
    expect(readStitch(tokenize('Lst'), 0, lexicon)).toMatchObject({ code, takes: 2 });
    expect(readStitch(tokenize('lsts'), 0, lexicon)).toMatchObject({ code, takes: 2 });
    expect(readStitch(tokenize('lstss'), 0, lexicon)).toBeNull();
  });
});
