import type { Reading } from '../../../lib/pattern/reading';
import { Select } from '../../ui/Select';
import type { usePatternReading } from './usePatternReading';

/** At which gauge, and to how many rounds, a pattern is looked at. */
export function PatternSettings(props: ReturnType<typeof usePatternReading>) {
  const { shown, rounds, mostRounds, setRounds, gaugeChoice, gaugeChoices, setGaugeKey } = props;
  return (
    <div className="not-printed flex w-full flex-wrap gap-3 sm:w-auto">
      {mostRounds > 1 && !isFlat(shown) && (
        <Select
          label="Worked to"
          className="w-36"
          value={String(rounds)}
          onChange={(event) => setRounds(Number(event.target.value))}
          options={Array.from({ length: mostRounds }, (_, i) => ({
            value: String(i + 1),
            word: i === 0 ? '1 round' : `${i + 1} rounds`,
          }))}
        />
      )}
      <Select
        label="At the gauge of"
        className="min-w-52 flex-1 sm:w-64"
        value={gaugeChoice?.key}
        onChange={(event) => setGaugeKey(event.target.value)}
        options={gaugeChoices.map(({ key, word }) => ({ value: key, word }))}
      />
    </div>
  );
}

const isFlat = ({ rounds }: Reading): boolean => rounds[0]?.kind === 'row';
