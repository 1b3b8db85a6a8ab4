// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import ColourSheet from '../../../src/components/planner/ColourSheet';
import { EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import { motifChoices } from '../../../src/lib/motifs/motifChoices';

afterEach(cleanup);

let now: Plan = EXAMPLE_PLAN;
function Sheet() {
  const [plan, setPlan] = useState(EXAMPLE_PLAN);
  now = plan;
  return (
    <ColourSheet
      plan={plan}
      change={(edit) => setPlan(edit)}
      choices={motifChoices()}
      onClose={() => undefined}
    />
  );
}

describe('ColourSheet', () => {
  it('mixes motifs of one shape: another takes its turn, and goes with its colourway', async () => {
    render(<Sheet />);
    const select = screen.getByLabelText('Add another motif');
    const offered = [...select.querySelectorAll('option')].map(({ value }) => value);
    expect(offered).toContain('solid-square');
    expect(offered).not.toContain('hexagon');
    expect(offered).not.toContain('group-square');
    fireEvent.change(select, { target: { value: 'solid-square' } });
    await waitFor(() =>
      expect(now.motifs.map(({ key }) => key)).toEqual(['group-square', 'solid-square']),
    );
    expect(now.colourways[3]?.motifIndex).toBe(1);
    fireEvent.click(screen.getByRole('button', { name: 'Remove colourway 4' }));
    expect(now.motifs).toHaveLength(1);
  });

  it('lets a colourway take no turn, so that it lies only where it is painted', () => {
    render(<Sheet />);
    const [, second] = screen.getAllByRole('checkbox', { name: /Takes its turn/ });
    fireEvent.click(second!);
    expect(now.placement.byHand).toEqual([1]);
    fireEvent.click(second!);
    expect(now.placement.byHand).toEqual([]);
  });
});
