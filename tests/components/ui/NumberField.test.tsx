// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { NumberField } from '../../../src/components/ui/NumberField';
import type { NumberReading } from '../../../src/components/ui/readNumber';

afterEach(cleanup);

function Kept({ onCommit }: { onCommit?: (reading: NumberReading) => void }) {
  const [value, setValue] = useState<number | null>(100);
  return (
    <>
      <NumberField
        label="Skein"
        unit="g"
        min={1}
        value={value}
        onCommit={(reading) => {
          onCommit?.(reading);
          if (reading.ok) setValue(reading.value);
        }}
      />
      <button onClick={() => setValue(50)}>Undo</button>
      <output>{value}</output>
    </>
  );
}

const field = () => screen.getByLabelText<HTMLInputElement>('Skein');
const type = (value: string) => fireEvent.change(field(), { target: { value } });

describe('NumberField', () => {
  it('keeps what was typed while it hands on what it reads', () => {
    render(<Kept />);
    for (const typed of ['9', '9,', '9,5']) type(typed);
    expect(field().value).toBe('9,5');
    expect(screen.getByRole('status').textContent).toBe('9.5');
  });

  it('says beside the field what is wrong, and leaves the last good value', () => {
    const onCommit = vi.fn();
    render(<Kept onCommit={onCommit} />);
    type('');
    expect(onCommit).toHaveBeenLastCalledWith({ ok: false, error: 'Write a number' });
    expect(field().getAttribute('aria-invalid')).toBe('true');
    const error = document.getElementById(field().getAttribute('aria-describedby') ?? '');
    expect(error?.textContent).toBe('Write a number');
    expect(screen.getByRole('status').textContent).toBe('100');
  });

  it('says nothing before it is touched', () => {
    render(<NumberField label="Skein" value={null} onCommit={() => {}} />);
    expect(field().getAttribute('aria-invalid')).toBeNull();
  });

  it('shows a value that changes from outside, over anything half typed', () => {
    render(<Kept />);
    type('12.');
    fireEvent.click(screen.getByText('Undo'));
    expect(field().value).toBe('50');
  });

  it('steps with the arrow keys and stops at the least', () => {
    render(<Kept />);
    type('2');
    for (const key of ['ArrowDown', 'ArrowDown', 'ArrowDown']) fireEvent.keyDown(field(), { key });
    expect(field().value).toBe('1');
    fireEvent.keyDown(field(), { key: 'ArrowUp' });
    expect(field().value).toBe('2');
  });
});
