import {
  lazy,
  Suspense,
  useCallback,
  useDeferredValue,
  useEffect,
  useId,
  useMemo,
  useRef,
  useState,
  type ReactNode,
} from 'react';
import { gaugeOf } from '../../../lib/gauge/gauge';
import { motifGeometry } from '../../../lib/motifs/geometry';
import type { MotifSides } from '../../../lib/motifs/motif';
import { motifOf } from '../../../lib/pattern/motifOf';
import { convertTerms } from '../../../lib/pattern/print/convertTerms';
import { readPattern } from '../../../lib/pattern/readPattern';
import type { Terms, WorkedRound } from '../../../lib/pattern/reading';
import type { Span } from '../../../lib/pattern/span';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import type { Units } from '../../../lib/units/display';
import type { StitchAddress } from '../../chart/SymbolChart';
import { classNames } from '../../ui/classNames';
import { SegmentedControl } from '../../ui/SegmentedControl';
import { Select } from '../../ui/Select';
import { useTerms, useUnits } from '../../ui/useUnits';
import { gaugeChoices } from '../motifs/gaugeChoices';
import { CleanPattern } from './CleanPattern';
import { editText } from './editText';
import { instructionSpans, stitchesAt } from './instructions';
import { PatternField } from './PatternField';
import { PatternOptions } from './PatternOptions';
import { PatternAnswer, PatternBar } from './PatternAnswer';
import { sizeCount } from './patternSizes';
import { Problems } from './Problems';
import { ReadRounds } from './ReadRounds';
import { usePlanning } from './usePlanning';

/** Fetched once there is something to draw. */
const SymbolChart = lazy(async () => ({
  default: (await import('../../chart/SymbolChart')).SymbolChart,
}));

const DRAWING = <p className="min-h-130 text-ink-2">Drawing the chart …</p>;

export interface PatternChange {
  text?: string;
  terms?: Terms;
  sides?: MotifSides;
}

export interface PatternEditorProps {
  name: string;
  text: string;
  /** Terms that the text is written in. */
  terms: Terms;
  sides: MotifSides;
  onChange: (change: PatternChange) => void;
  /** The person's own choices, for everything but the text. */
  units: Units;
  shownTerms: Terms;
  swatches: GaugeSwatch[];
  ownStitches?: readonly OwnStitch[];
  /** Below the problems: the stitches of the person's own, given what writes one into the text. */
  stitchesPanel?: (onInsert: (abbreviation: string) => void) => ReactNode;
  /** Takes a word that is not understood for a stitch of the person's own. */
  onAddStitch?: (word: string) => void;
  /** Above the text, such as the motif's name. */
  heading?: ReactNode;
  /** Acts beside "Plan a blanket", such as keeping the motif. */
  actions?: ReactNode;
}

type Panel = 'text' | 'chart' | 'rounds';
const PANELS = [
  { value: 'text', word: 'Text' },
  { value: 'chart', word: 'Chart' },
  { value: 'rounds', word: 'Rounds' },
] as const;

/** A pattern read as it is typed: its problems, its chart, its rounds, and a clean page of it. */
export function PatternEditor(props: PatternEditorProps) {
  const { name, text, terms, sides, onChange, swatches, ownStitches } = props;
  const { heading, actions, stitchesPanel, onAddStitch } = props;
  const units = useUnits(props.units);
  const shownTerms = useTerms(props.shownTerms);
  const [size, setSize] = useState(0);
  const [panel, setPanel] = useState<Panel>('text');
  const [lit, setLit] = useState<Span | null>(null);
  const [offset, setOffset] = useState<number | null>(null);
  const [gaugeKey, setGaugeKey] = useState(swatches[0]?.id ?? 'weight-4');
  // What is fetched later is left to the browser: streamed by the server it would need inline scripts.
  const [isShown, setIsShown] = useState(false);
  useEffect(() => setIsShown(true), []);
  const field = useRef<HTMLTextAreaElement>(null);
  const problemsId = useId();
  /** Terms of the texts that were rewritten, so that undoing the rewriting brings them back too. */
  const rewritten = useRef(new Map<string, Terms>());

  // A key is on the screen before a long pattern is read again, and read before it is drawn again.
  const readText = useDeferredValue(text);
  const reading = useMemo(
    () => readPattern(readText, { terms, sides, size, ...(ownStitches && { ownStitches }) }),
    [readText, terms, sides, size, ownStitches],
  );
  const drawn = useDeferredValue(reading);
  const instructions = useMemo(() => instructionSpans(reading), [reading]);
  const at = useDeferredValue(offset);
  const marked = useMemo(() => (at === null ? [] : stitchesAt(drawn, at)), [drawn, at]);

  const choices = useMemo(() => gaugeChoices(swatches, units), [swatches, units]);
  const choice = choices.find(({ key }) => key === gaugeKey) ?? choices[0];
  const gauge = useMemo(
    () => gaugeOf(choice?.swatch ?? null, choice?.category ?? 4),
    [choice?.swatch, choice?.category],
  );
  const geometry = useMemo(
    () => motifGeometry(motifOf(drawn, '', name), gauge, null),
    [drawn, gauge, name],
  );
  // Chart and table are drawn again only with a new reading, and so must be given the same functions.
  const lightStitch = useCallback(
    (at: StitchAddress | null) =>
      setLit(at && (drawn.rounds[at.round]?.stitches[at.stitch]?.span ?? drawn.ring.span)),
    [drawn],
  );
  const lightRound = useCallback((round: WorkedRound | null) => setLit(round && round.span), []);
  const planning = usePlanning(reading, name);
  const sizes = sizeCount(reading.pattern);
  const isEmpty = drawn.rounds.length === 0;
  const only = (which: Panel) =>
    classNames('min-w-0 print:block', panel !== which && 'max-lg:hidden');

  function edit(begin: number, end: number, replacement: string) {
    if (field.current) editText(field.current, begin, end, replacement);
  }

  function go({ begin, end }: Span) {
    setPanel('text');
    requestAnimationFrame(() => {
      field.current?.focus();
      field.current?.setSelectionRange(begin, end);
      document.querySelector(`[data-begin="${begin}"]`)?.scrollIntoView({ block: 'nearest' });
    });
  }

  function convert() {
    const other = terms === 'us' ? 'uk' : 'us';
    const converted = convertTerms(text, terms, other);
    rewritten.current.set(text, terms).set(converted, other);
    edit(0, text.length, converted);
    onChange({ terms: other });
  }

  function insert(abbreviation: string) {
    const { selectionStart = text.length, selectionEnd = text.length } = field.current ?? {};
    edit(selectionStart, selectionEnd, abbreviation);
  }

  return (
    <>
      <SegmentedControl
        label="Show"
        className="not-printed mb-4 lg:hidden"
        options={PANELS}
        value={panel}
        onChange={setPanel}
      />
      <div className="grid gap-x-10 gap-y-8 lg:grid-cols-2">
        <div className={classNames(only('text'), 'not-printed')}>
          {heading}
          <PatternOptions
            {...{ terms, sides, size, sizes }}
            onTerms={(next) => onChange({ terms: next })}
            onSides={(next) => onChange({ sides: next })}
            onSize={setSize}
            onConvert={text.trim() === '' ? null : convert}
          />
          <PatternField
            {...{ text, readText, instructions, lit }}
            fieldRef={field}
            problems={reading.diagnostics}
            onText={(next) => {
              const known = rewritten.current.get(next);
              onChange({ text: next, ...(known && { terms: known }) });
            }}
            onOffset={setOffset}
            describedBy={problemsId}
          />
          {text.trim() !== '' && (
            <Problems
              id={problemsId}
              problems={reading.diagnostics}
              onGo={go}
              onFix={({ begin, end, replacement }) => edit(begin, end, replacement)}
              onAddStitch={
                onAddStitch && (({ begin, end }) => onAddStitch(readText.slice(begin, end)))
              }
            />
          )}
          {stitchesPanel?.(insert)}
        </div>
        <div className={only('chart')}>
          <div className="mb-3 flex flex-wrap items-end justify-between gap-3">
            <PatternAnswer reading={drawn} {...{ geometry, units, planning, actions }} />
            {!isEmpty && (
              <Select
                label="At the gauge of"
                className="not-printed w-full sm:w-72"
                value={choice?.key}
                onChange={(event) => setGaugeKey(event.target.value)}
                options={choices.map(({ key, word }) => ({ value: key, word }))}
              />
            )}
          </div>
          {!isEmpty && !isShown && DRAWING}
          {!isEmpty && isShown && (
            <Suspense fallback={DRAWING}>
              <SymbolChart
                {...{ gauge, name, units, marked }}
                reading={drawn}
                terms={shownTerms}
                ownStitches={ownStitches}
                onPoint={lightStitch}
              />
            </Suspense>
          )}
        </div>
      </div>
      {!isEmpty && (
        <>
          <section aria-labelledby="read-rounds" className={classNames(only('rounds'), 'mt-10')}>
            <h2 id="read-rounds" className="mb-2">
              Rounds
            </h2>
            <ReadRounds
              {...{ reading: drawn, geometry, gauge, units }}
              terms={shownTerms}
              onRound={lightRound}
            />
          </section>
          <div className={classNames(only('rounds'), 'mt-10')}>
            <CleanPattern key={terms} reading={drawn} ownStitches={ownStitches} />
          </div>
        </>
      )}
      <PatternBar reading={drawn} {...{ geometry, units, planning }} />
    </>
  );
}
