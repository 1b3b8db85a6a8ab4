import { describe, expect, it } from 'vitest';
import { positionFinder } from '../../../src/lib/pattern/position';

describe('positionFinder', () => {
  it('counts lines and columns from 1, whatever ends the lines', () => {
    const text = 'ab\ncd\r\nef\rg';
    const at = positionFinder(text);
    const positions = ['a', 'b', 'c', 'd', 'e', 'f', 'g'].map((letter) => {
      const { line, column } = at(text.indexOf(letter));
      return `${letter} ${line}:${column}`;
    });
    expect(positions).toEqual(['a 1:1', 'b 1:2', 'c 2:1', 'd 2:2', 'e 3:1', 'f 3:2', 'g 4:1']);
    expect(at(text.length)).toEqual({ line: 4, column: 2 });
    expect(positionFinder('')(0)).toEqual({ line: 1, column: 1 });
  });
});
