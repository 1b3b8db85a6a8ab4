import { useFormContext, useWatch } from 'react-hook-form';
import { isTakenWord } from '../../../lib/pattern/terms/takenWord';
import { OWN_STITCH_LIMITS, type OwnStitch } from '../../../lib/stitches/ownStitch';
import type { OwnStitchForm } from '../../../schemas/ownStitch';
import type { Terms } from '../../planner/stitchWord';
import { Field } from '../../ui/Field';
import { NumberInput } from '../form/NumberInput';
import { MoveFields } from './MoveFields';
import { takenWords } from './refusedHere';
import { StitchSymbol } from './StitchSymbol';
import { likeness, movesComeTo } from './stitchWords';
import { SymbolFields } from './SymbolFields';

interface StitchFieldsProps {
  /** As it can be drawn and counted now. */
  stitch: OwnStitch;
  terms: Terms;
}

/** What a stitch is called, how it is made, and what that comes to at every move. */
export function StitchFields({ stitch, terms }: StitchFieldsProps) {
  const { control, register, formState } = useFormContext<OwnStitchForm>();
  const errors = formState.errors.stitch;
  const abbreviation = useWatch({ control, name: 'stitch.abbreviation' });
  const taken = isTakenWord(abbreviation) ? takenWords(abbreviation) : undefined;
  return (
    <>
      <div className="grid grid-cols-6 gap-x-2.5 gap-y-3">
        <Field
          className="col-span-2"
          label="Abbreviation"
          id="stitch.abbreviation"
          hint="as patterns write it"
          maxLength={OWN_STITCH_LIMITS.abbreviation}
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
          error={errors?.abbreviation?.message ?? taken}
          {...register('stitch.abbreviation', {
            setValueAs: (typed: string) => typed.trim().toLowerCase(),
          })}
        />
        <Field
          className="col-span-4"
          label="Name"
          id="stitch.name"
          hint="in whole words, for the key"
          autoComplete="off"
          error={errors?.name?.message}
          {...register('stitch.name')}
        />
      </div>
      <MoveFields />
      <ComesTo {...{ stitch, terms }} />
      <div className="grid grid-cols-2 gap-x-2.5 gap-y-3">
        <NumberInput
          control={control}
          name="stitch.heightOverWidth"
          label="Measured height"
          unit="widths"
          step={0.05}
          hint="row height over stitch width, where you know it"
        />
        <NumberInput
          control={control}
          name="stitch.takes"
          label="Stitches taken up"
          whole
          hint="2 where it gathers two, 0 where it stands on the last stitch like a picot"
        />
      </div>
      <SymbolFields stitch={stitch} />
    </>
  );
}

function ComesTo({ stitch, terms }: StitchFieldsProps) {
  const { moves, heightOverWidth } = stitch;
  const isMade = moves.draws + moves.throughs > 0;
  const like = isMade && likeness(moves, terms);
  return (
    <div role="status" className="flex min-h-14 items-center gap-3">
      {isMade && <StitchSymbol stitch={stitch} className="h-14 w-10" />}
      <p>
        {isMade ? (
          <>
            <b className="block text-lg">{movesComeTo(moves, heightOverWidth)}</b>
            {like && <span className="text-ink-2">{like}</span>}
          </>
        ) : (
          'A stitch needs at least one draw or one through.'
        )}
      </p>
    </div>
  );
}
