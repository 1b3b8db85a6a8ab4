// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Button } from '../../../src/components/ui/Button';
import { Checkbox } from '../../../src/components/ui/Checkbox';
import { Dialog } from '../../../src/components/ui/Dialog';
import { ErrorSummary } from '../../../src/components/ui/ErrorSummary';
import { Field } from '../../../src/components/ui/Field';
import { saveWords } from '../../../src/components/ui/SaveStatus';
import { SegmentedControl } from '../../../src/components/ui/SegmentedControl';
import { Select } from '../../../src/components/ui/Select';
import { stubWidth } from '../resizeObserver';

beforeEach(() => stubWidth(320));
afterEach(cleanup);

describe('Button', () => {
  it('takes no press while busy, keeps the focus and says what it is doing', () => {
    const onClick = vi.fn();
    render(
      <Button busy="Saving…" onClick={onClick}>
        Save
      </Button>,
    );
    const button = screen.getByRole('button', { name: 'Saving…' });
    button.focus();
    fireEvent.click(button);
    expect(onClick).not.toHaveBeenCalled();
    expect(document.activeElement).toBe(button);
    expect(button.getAttribute('aria-disabled')).toBe('true');
  });

  it('does not send a form while busy', () => {
    const onSubmit = vi.fn();
    render(
      <form onSubmit={onSubmit}>
        <Button type="submit" busy="Saving…">
          Save
        </Button>
      </form>,
    );
    fireEvent.click(screen.getByRole('button'));
    expect(onSubmit).not.toHaveBeenCalled();
  });
});

describe('Field and Select', () => {
  it('read out the hint and the error with the field', () => {
    render(<Field label="Name" hint="As on the band." error="Write a name" unit="g" />);
    const input = screen.getByLabelText('Name');
    const described = (input.getAttribute('aria-describedby') ?? '')
      .split(' ')
      .map((id) => document.getElementById(id)?.textContent);
    expect(described).toEqual(['As on the band.', 'Write a name']);
    expect(input.getAttribute('aria-invalid')).toBe('true');
  });

  it('offer each choice by its word', () => {
    const onChange = vi.fn();
    render(
      <Select
        label="Join"
        value="whip"
        onChange={(event) => onChange(event.target.value)}
        options={[
          { value: 'whip', word: 'Whip stitch' },
          { value: 'braid', word: 'Flat braid' },
        ]}
      />,
    );
    fireEvent.change(screen.getByLabelText('Join'), { target: { value: 'braid' } });
    expect(onChange).toHaveBeenCalledWith('braid');
  });
});

describe('SegmentedControl', () => {
  it('is a radio group with one choice in force', () => {
    const onChange = vi.fn();
    render(
      <SegmentedControl
        label="How sure"
        value="95"
        onChange={onChange}
        options={[
          { value: '90', word: '90 %' },
          { value: '95', word: '95 %' },
        ]}
      />,
    );
    expect(screen.getByRole('radiogroup', { name: 'How sure' })).toBeDefined();
    expect(screen.getByRole('radio', { name: '95 %' }).getAttribute('aria-checked')).toBe('true');
    fireEvent.click(screen.getByRole('radio', { name: '90 %' }));
    expect(onChange).toHaveBeenCalledWith('90');
  });
});

describe('Checkbox', () => {
  it('can stand for some of many, and still hands its element to a form library', () => {
    let element: HTMLInputElement | null = null;
    render(
      <Checkbox
        label="All rounds"
        mixed
        ref={(input) => {
          element = input;
        }}
      />,
    );
    expect(screen.getByLabelText<HTMLInputElement>('All rounds').indeterminate).toBe(true);
    expect(element).toBe(screen.getByLabelText('All rounds'));
  });
});

describe('Dialog', () => {
  it('is named and described, and closes with its button and with Escape', () => {
    const onOpenChange = vi.fn();
    render(
      <Dialog open onOpenChange={onOpenChange} title="Remove this lot?" description="Lot K418." />,
    );
    expect(
      screen.getByRole('dialog', { name: 'Remove this lot?', description: 'Lot K418.' }),
    ).toBeDefined();
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    fireEvent.keyDown(document.activeElement ?? document.body, { key: 'Escape' });
    expect(onOpenChange.mock.calls).toEqual([[false], [false]]);
  });
});

describe('ErrorSummary', () => {
  const errors = [
    { field: 'width', message: 'Write the width' },
    { field: 'grams', message: 'Write the grams' },
  ];

  it('puts the cursor on the first field in error at each attempt', () => {
    const form = (attempt: number) => (
      <>
        <ErrorSummary errors={errors} attempt={attempt} />
        <input id="width" />
        <input id="grams" />
      </>
    );
    const { rerender } = render(form(0));
    expect(document.activeElement).toBe(document.body);
    rerender(form(1));
    expect(document.activeElement?.id).toBe('width');
    fireEvent.click(screen.getByText('Write the grams'));
    expect(document.activeElement?.id).toBe('grams');
    rerender(form(2));
    expect(document.activeElement?.id).toBe('width');
  });

  it('counts what is to be put right', () => {
    render(<ErrorSummary errors={errors.slice(0, 1)} attempt={0} />);
    expect(screen.getByRole('alert').textContent).toContain('One thing to put right');
  });

  it('is not there without errors', () => {
    expect(render(<ErrorSummary errors={[]} attempt={0} />).container.innerHTML).toBe('');
  });
});

describe('saveWords', () => {
  it('says how saving stands', () => {
    expect(saveWords({ is: 'saved' })).toBe('Saved');
    expect(saveWords({ is: 'saved', at: '14:05' })).toBe('Saved 14:05');
    expect(saveWords({ is: 'saving' })).toBe('Saving…');
    expect(saveWords({ is: 'failed', why: 'no connection' })).toBe('Not saved: no connection');
  });
});
