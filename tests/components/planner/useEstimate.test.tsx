// @vitest-environment jsdom
import { cleanup, renderHook } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { useEstimate } from '../../../src/components/planner/useEstimate';
import { estimate, EXAMPLE_PLAN, type Plan } from '../../../src/lib';

afterEach(cleanup);

const IMPOSSIBLE: Plan = { ...EXAMPLE_PLAN, join: { key: 'glue', colour: 'c1' } };
const watching = (initial: Plan) =>
  renderHook((plan: Plan) => useEstimate(plan, EXAMPLE_PLAN), { initialProps: initial });

describe('useEstimate', () => {
  it("gives the library's own estimate", () => {
    const { result } = watching(EXAMPLE_PLAN);
    expect(result.current).toEqual({ estimate: estimate(EXAMPLE_PLAN), impossible: false });
  });

  it('keeps the last possible answer while a plan has none', () => {
    const wide: Plan = { ...EXAMPLE_PLAN, size: { by: 'grid', rows: 10, columns: 20 } };
    const { result, rerender } = watching(wide);
    const last = result.current.estimate;
    rerender({ ...wide, join: IMPOSSIBLE.join });
    expect(result.current.impossible).toBe(true);
    expect(result.current.estimate).toBe(last);
    rerender(EXAMPLE_PLAN);
    expect(result.current).toEqual({ estimate: estimate(EXAMPLE_PLAN), impossible: false });
  });

  it('shows what the page was opened with where there never was an answer', () => {
    const { result } = watching(IMPOSSIBLE);
    expect(result.current).toEqual({ estimate: estimate(EXAMPLE_PLAN), impossible: true });
  });

  it('works nothing out again while the plan stays', () => {
    const { result, rerender } = watching(EXAMPLE_PLAN);
    const first = result.current;
    rerender(EXAMPLE_PLAN);
    expect(result.current).toBe(first);
  });

  it('does not hide a fault of the program', () => {
    const broken = { ...EXAMPLE_PLAN, colours: undefined } as unknown as Plan;
    expect(() => watching(broken)).toThrow(TypeError);
  });
});
