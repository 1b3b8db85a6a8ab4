// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import BorderSheet from '../../../src/components/planner/BorderSheet';
import { estimate, EXAMPLE_PLAN, type Plan } from '../../../src/lib';

afterEach(cleanup);

let shown: Plan = EXAMPLE_PLAN;
function Editing({ terms = 'us' as 'us' | 'uk' }) {
  const [plan, setPlan] = useState(EXAMPLE_PLAN);
  shown = plan;
  return (
    <BorderSheet
      {...{ plan, terms }}
      estimate={estimate(plan)}
      units="metric"
      change={(edit) => setPlan(edit)}
      onClose={() => {}}
    />
  );
}
const rounds = () => within(screen.getAllByRole('list')[0]!).getAllByRole('heading');
const click = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }));

describe('BorderSheet', () => {
  it('counts each round on this blanket', () => {
    render(<Editing />);
    expect(rounds().map((heading) => heading.textContent)).toEqual([
      'Round 1',
      'Round 2',
      'Round 3',
    ]);
    // by hand: 8 × 15 + 7 × 2 + 1 = 135 up to the next corner, 2 more in the round; 10 × 15 + 9 × 2 + 1 = 169
    screen.getByText('616 sc, 1 ch, 1 sl st: 137 along top and bottom, 171 along either side');
  });

  it('says that an edging does not come out even, and makes it with one click', () => {
    render(<Editing />);
    click('Add Shells');
    // by hand: 141 = 23 × 6 + 3, 175 = 29 × 6 + 1
    screen.getByText(
      '3 stitches are left over along the top and bottom, 1 along the right and left.',
    );
    click(/^Do this for round 4/);
    // by hand: 24 + 29 + 24 + 29
    screen.getByText('Even at all four corners: 106 repeats of 6 stitches.');
    expect(shown.border[2]?.adjust).toEqual([3, -1, 3, -1]);
    screen.getByText(/With 3 more on the top and bottom, and 1 fewer on the right and left/);
    click('Leave that out');
    screen.getByText(/^3 stitches are left over/);
  });

  it('moves, recolours and takes out rounds', () => {
    render(<Editing />);
    click('Add Picots');
    click('Move Round 4 inwards');
    expect(shown.border.map(({ edging }) => edging?.name ?? 'plain')).toEqual([
      'plain',
      'plain',
      'Picots',
      'plain',
    ]);
    fireEvent.change(screen.getByLabelText('Colour of Round 3'), { target: { value: 'c3' } });
    expect(shown.border[2]?.colour).toBe('c3');
    click('Remove Round 1');
    expect(shown.border).toHaveLength(3);
    expect(screen.getByRole('button', { name: 'Move Round 1 inwards' })).toHaveProperty(
      'disabled',
      true,
    );
  });

  it('reads an edging as it is typed, in the person’s terms', () => {
    render(<Editing terms="uk" />);
    const text = screen.getByLabelText('One round, in UK terms');
    fireEvent.change(text, {
      target: { value: 'Ch 1, *dc in next 4 sts, frob; rep from * around.' },
    });
    screen.getByText(/"frob" is not an abbreviation/);
    const add = screen.getByRole('button', { name: 'Add it as the outermost round', hidden: true });
    expect(add).toHaveProperty('disabled', true);
    fireEvent.change(text, {
      target: {
        value: 'Ch 1, *dc in next 4 sts, ch-3 picot; rep from * around; join with ss in first dc.',
      },
    });
    screen.getByText('A multiple of 4 stitches; in each repeat 4 dc, 1 picot-3.');
    fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'Thorns' } });
    fireEvent.click(add);
    expect(rounds().at(-1)?.textContent).toBe('Round 4: Thorns');
    expect(shown.border.at(-1)?.edging?.made.perRepeat).toEqual({ sc: 4, 'picot-3': 1 });
  });
});
