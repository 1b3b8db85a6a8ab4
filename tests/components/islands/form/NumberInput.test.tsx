import { zodResolver } from '@hookform/resolvers/zod';
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { NumberInput } from '../../../../src/components/islands/form/NumberInput';
import { lotFormSchema, type LotForm } from '../../../../src/schemas/stashEntry';

afterEach(cleanup);

const start: LotForm = {
  lot: {
    lotCode: '',
    location: '',
    pricePaid: null,
    wholeSkeins: 3,
    partSkeins: [{ massG: 50.8 }],
  },
};

/** A part skein shown in units of `factor` g, changed by a button. */
function Form({ onSave = () => {} }: { onSave?: (values: LotForm) => void }) {
  const { control, handleSubmit } = useForm<LotForm>({
    resolver: zodResolver(lotFormSchema),
    defaultValues: start,
  });
  const [factor, setFactor] = useState(25.4);
  const massG = useWatch({ control, name: 'lot.partSkeins.0.massG' });
  return (
    <form onSubmit={handleSubmit(onSave)}>
      <NumberInput control={control} name="lot.partSkeins.0.massG" label="Part" factor={factor} />
      <output>{String(massG)}</output>
      <button type="button" onClick={() => setFactor(10)}>
        Other unit
      </button>
      <button>Save</button>
    </form>
  );
}

const field = () => screen.getByLabelText<HTMLInputElement>('Part');
const type = (value: string) => fireEvent.change(field(), { target: { value } });
const stored = () => screen.getByRole('status').textContent;

describe('NumberInput', () => {
  it('shows the stored number in the unit and stores what is typed in its own', () => {
    render(<Form />);
    expect(field().value).toBe('2');
    type('3');
    expect(Number(stored())).toBeCloseTo(76.2, 9);
  });

  it('leaves a figure as it was typed, however many digits it has', () => {
    render(<Form />);
    type('5.90551');
    expect(field().value).toBe('5.90551');
  });

  it('shows the same length in another unit, to two decimals', () => {
    render(<Form />);
    type('5.90551');
    fireEvent.click(screen.getByText('Other unit'));
    // 5.90551 × 25.4 / 10
    expect(field().value).toBe('15');
    expect(Number(stored())).toBeCloseTo(149.999954, 9);
  });

  it('refuses the form while the text cannot be read, and says so in the words of the field', async () => {
    const onSave = vi.fn();
    render(<Form onSave={onSave} />);
    type('abc');
    fireEvent.click(screen.getByText('Save'));
    expect(await screen.findByText('Write a number, such as 12.5')).toBeTruthy();
    expect(field().value).toBe('abc');
    expect(onSave).not.toHaveBeenCalled();
  });

  it('stores an empty field as missing, which the schema refuses', async () => {
    const onSave = vi.fn();
    render(<Form onSave={onSave} />);
    type('');
    expect(stored()).toBe('null');
    fireEvent.click(screen.getByText('Save'));
    expect(await screen.findByText('Mass of a part skein is missing')).toBeTruthy();
    expect(onSave).not.toHaveBeenCalled();
  });

  it('saves again once what was wrong is put right', async () => {
    const onSave = vi.fn();
    render(<Form onSave={onSave} />);
    type('abc');
    type('4');
    fireEvent.click(screen.getByText('Save'));
    await waitFor(() => expect(onSave).toHaveBeenCalled());
    expect(onSave.mock.calls[0]?.[0].lot.partSkeins[0].massG).toBeCloseTo(101.6, 9);
  });
});
