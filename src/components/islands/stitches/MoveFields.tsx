import { useController, useFormContext } from 'react-hook-form';
import { OWN_STITCH_LIMITS } from '../../../lib/stitches/ownStitch';
import type { OwnStitchForm } from '../../../schemas/ownStitch';
import { NumberInput } from '../form/NumberInput';

const MOVES = [
  { move: 'wraps', label: 'Wraps', one: 'wrap', hint: 'yarn over before the hook goes in' },
  { move: 'draws', label: 'Draws', one: 'draw', hint: 'hook in, yarn over, draw a loop up' },
  { move: 'throughs', label: 'Throughs', one: 'through', hint: 'yarn over, draw through loops' },
] as const;

/** How often each move is made, typed or counted up and down. */
export function MoveFields() {
  return (
    <fieldset>
      <legend className="mb-1 font-bold">How it is made</legend>
      <div className="divide-y divide-line border-y border-line">
        {MOVES.map((each) => (
          <MoveField key={each.move} {...each} />
        ))}
      </div>
    </fieldset>
  );
}

function MoveField({ move, label, one, hint }: (typeof MOVES)[number]) {
  const { control } = useFormContext<OwnStitchForm>();
  const name = `stitch.moves.${move}` as const;
  const { field } = useController({ control, name });
  const count = Number.isInteger(field.value) ? field.value : 0;
  const most = OWN_STITCH_LIMITS[move];
  return (
    <div className="flex items-start gap-2 py-2.5">
      <NumberInput
        className="grid flex-1 grid-cols-[1fr_4rem] items-start gap-x-3 [&>.control]:col-start-2 [&>.control]:row-span-2 [&>.control]:row-start-1 [&>.label]:mb-0 [&>.label]:self-end [&>.label]:text-base [&>.label]:text-ink [&>p]:mt-0 [&>p:last-child:not(:nth-child(3))]:col-span-2"
        control={control}
        name={name}
        label={label}
        hint={hint}
        whole
      />
      <span className="segments">
        <Step
          sign="−"
          words={`One ${one} fewer`}
          disabled={count <= 0}
          onClick={() => field.onChange(Math.min(most, count - 1))}
        />
        <Step
          sign="+"
          words={`One ${one} more`}
          disabled={count >= most}
          onClick={() => field.onChange(Math.max(0, count + 1))}
        />
      </span>
    </div>
  );
}

interface StepProps {
  sign: string;
  words: string;
  disabled: boolean;
  onClick: () => void;
}

function Step({ sign, words, disabled, onClick }: StepProps) {
  return (
    <button
      type="button"
      className="segment min-h-[38px] min-w-[38px] font-mono text-lg aria-disabled:text-ink-2 coarse:min-h-[42px] coarse:min-w-[42px]"
      aria-label={words}
      // Not `disabled`: the focus would be lost at the last step down.
      aria-disabled={disabled || undefined}
      onClick={disabled ? undefined : onClick}
    >
      {sign}
    </button>
  );
}
