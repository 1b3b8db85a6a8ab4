import { describe, expect, it } from 'vitest';
import { mergeMarks } from '../../../src/lib/making/mergeMarks';

const at = (minute: number) => new Date(Date.UTC(2026, 10, 30, 18, minute)).toISOString();
const tick = (motif: string, done: boolean, minute: number) => ({ motif, done, at: at(minute) });

describe('mergeMarks', () => {
  it('lets the later of two marks count, whichever record has it', () => {
    const phone = { ticks: [tick('m0:0', true, 1), tick('m0:1', false, 9)], weighings: [] };
    const desk = { ticks: [tick('m0:1', true, 5), tick('m0:2', true, 2)], weighings: [] };
    const merged = [tick('m0:0', true, 1), tick('m0:1', false, 9), tick('m0:2', true, 2)];
    const sorted = (made: { ticks: readonly ReturnType<typeof tick>[] }) =>
      made.ticks.toSorted((a, b) => (a.motif < b.motif ? -1 : 1));
    expect(sorted(mergeMarks(phone, desk))).toEqual(merged);
    expect(sorted(mergeMarks(desk, phone))).toEqual(merged);
    expect(sorted(mergeMarks(mergeMarks(phone, desk), desk))).toEqual(merged);
  });

  it('puts weighings in the order of time, each once', () => {
    const weighing = (id: string, minute: number) => ({ id, at: at(minute) });
    const one = { ticks: [], weighings: [weighing('b', 5)] };
    const other = { ticks: [], weighings: [weighing('a', 2), weighing('b', 5)] };
    expect(mergeMarks(one, other).weighings).toEqual([weighing('a', 2), weighing('b', 5)]);
  });
});
