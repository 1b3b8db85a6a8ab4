import { describe, expect, it } from 'vitest';
import { normalise } from '../../../src/lib/pattern/normalise';

const plain = (text: string) => normalise(text).plain;

describe('normalise', () => {
  it.each([
    ['Ch\u00a03 \u2013 2 dc', 'Ch 3 - 2 dc'],
    ['\u201csc\u201d \u2018s\u2019', '"sc" \'s\''],
    ['\u22173 dc\uff1b rep \u2217', '*3 dc; rep *'],
    ['6 \u00d7 and 2\u2009x', '6 x and 2 x'],
    ['\uff13 \uff44\uff43', '3 dc'],
    ['\ufb01rst pu\ufb00', 'first puff'],
    ['re\u00adpeat\u200b', 'repeat'],
    ['a\r\nb\rc\u2028d', 'a\nb\nc\nd'],
    // broken at the end of a line: a word loses its hyphen, "ch-2" keeps it
    ['begin-\n   ning', 'beginning'],
    ['ch-\n2 sp', 'ch-2 sp'],
    ['3-\ndc cl', '3-dc cl'],
    // a dash between clauses is no broken word
    ['join -\nRnd 2', 'join -\nRnd 2'],
    ['join-\nRnd 2', 'join-\nRnd 2'],
    ['\u0000\u0007', '  '],
  ])('makes %j plain', (text, expected) => expect(plain(text)).toBe(expected));

  it('knows where every character stood', () => {
    const text = '\ufb01n re\u00adp \u2013 begin-\nning';
    const { plain: result, offsets } = normalise(text);
    expect(result).toBe('fin rep - beginning');
    expect(offsets[0]).toBe(0); // f and i of one ligature
    expect(offsets[1]).toBe(0);
    expect(offsets[2]).toBe(1);
    expect(text[offsets[result.indexOf('p')] ?? -1]).toBe('p');
    expect(text[offsets[result.indexOf('-')] ?? -1]).toBe('\u2013');
    expect(text.slice(offsets[result.indexOf('ning')] ?? 0)).toBe('ning');
    expect(offsets[result.length]).toBe(text.length);
  });

  it('leaves plain text as it is', () => {
    const text = 'Rnd 1: Ch 3, (2 dc, ch 2) in next ch-2 sp.\n';
    expect(normalise(text)).toEqual({
      plain: text,
      offsets: Int32Array.from({ length: text.length + 1 }, (_, i) => i),
    });
  });
});
