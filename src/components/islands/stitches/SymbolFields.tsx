import { RadioGroup } from 'radix-ui';
import { useFormContext } from 'react-hook-form';
import {
  OWN_STITCH_LIMITS,
  SYMBOL_BODIES,
  type OwnStitch,
  type OwnSymbol,
  type SymbolBody,
} from '../../../lib/stitches/ownStitch';
import type { OwnStitchForm } from '../../../schemas/ownStitch';
import { NumberInput } from '../form/NumberInput';
import { StitchSymbol } from './StitchSymbol';
import { BODY_WORDS } from './stitchWords';

const BY_MOVES = 'moves';
const WITH_STEMS: ReadonlySet<SymbolBody> = new Set(['legs', 'popcorn', 'puff']);

interface SymbolFieldsProps {
  /** As it can be drawn now. */
  stitch: OwnStitch;
}

/** What a chart draws: the symbol that its moves give, or a standard one with its stems and strokes. */
export function SymbolFields({ stitch }: SymbolFieldsProps) {
  const { control, setValue } = useFormContext<OwnStitchForm>();
  const { symbol } = stitch;
  const draws = Math.min(OWN_STITCH_LIMITS.legs, Math.max(1, stitch.moves.draws));

  function symbolOf(body: SymbolBody): OwnSymbol {
    if (body === 'picot') return { body, legs: symbol?.body === body ? symbol.legs : 3, bars: 0 };
    if (!WITH_STEMS.has(body)) return { body, legs: 1, bars: 0 };
    if (symbol && WITH_STEMS.has(symbol.body)) return { ...symbol, body };
    const least = body === 'legs' ? 1 : 3;
    return { body, legs: Math.max(least, draws), bars: body === 'puff' ? 0 : 1 };
  }
  const choose = (value: string) =>
    setValue('stitch.symbol', value === BY_MOVES ? null : symbolOf(value as SymbolBody), {
      shouldDirty: true,
      shouldValidate: true,
    });

  return (
    <fieldset>
      <legend className="mb-1 font-bold">Its symbol in charts</legend>
      <RadioGroup.Root
        aria-label="Symbol"
        value={symbol?.body ?? BY_MOVES}
        onValueChange={choose}
        className="grid grid-cols-4 gap-2"
      >
        <Tile value={BY_MOVES} word="by its moves" stitch={{ ...stitch, symbol: null }} />
        {SYMBOL_BODIES.map((body) => (
          <Tile
            key={body}
            value={body}
            word={BODY_WORDS[body]}
            stitch={{ ...stitch, symbol: symbolOf(body) }}
          />
        ))}
      </RadioGroup.Root>
      {symbol && (WITH_STEMS.has(symbol.body) || symbol.body === 'picot') && (
        <div className="mt-3 grid grid-cols-2 gap-x-2.5">
          <NumberInput
            control={control}
            name="stitch.symbol.legs"
            label={symbol.body === 'picot' ? 'Chains' : 'Stems'}
            whole
          />
          {symbol.body !== 'picot' && (
            <NumberInput
              control={control}
              name="stitch.symbol.bars"
              label="Strokes across each"
              whole
            />
          )}
        </div>
      )}
    </fieldset>
  );
}

function Tile({ value, word, stitch }: { value: string; word: string; stitch: OwnStitch }) {
  return (
    <RadioGroup.Item
      value={value}
      className="flex min-h-20 flex-col items-center justify-between gap-1 rounded-control border border-line bg-surface px-1 pt-2 pb-1.5 text-center text-sm hover:border-edge aria-checked:border-teal aria-checked:bg-teal-soft aria-checked:font-bold aria-checked:shadow-[inset_0_0_0_1px_var(--color-teal)]"
    >
      <StitchSymbol stitch={stitch} />
      {word}
    </RadioGroup.Item>
  );
}
