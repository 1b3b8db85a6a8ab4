import {
  lazy,
  Suspense,
  useCallback,
  useDeferredValue,
  useId,
  useMemo,
  useRef,
  useState,
  type KeyboardEvent,
  type ReactNode,
} from 'react';
import type { Gauge } from '../../../lib/gauge/gauge';
import type { Motif } from '../../../lib/motifs/motif';
import { convertTerms } from '../../../lib/pattern/print/convertTerms';
import type { Terms, WorkedRound } from '../../../lib/pattern/reading';
import type { Span } from '../../../lib/pattern/span';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import { showFabric, type Units } from '../../../lib/units/display';
import type { StitchAddress } from '../../chart/SymbolChart';
import { acrossWord, SHAPE_WORDS } from '../../motifs/motifWords';
import { classNames } from '../../ui/classNames';
import { SegmentedControl } from '../../ui/SegmentedControl';
import { useIsHere } from '../../ui/useIsHere';
import { useTerms, useUnits } from '../../ui/useUnits';
import type { GaugeChoice } from '../motifs/gaugeChoices';
import { CleanPattern } from './CleanPattern';
import { editText } from './editText';
import { instructionSpans, stitchesAt, stitchesOfRound } from './instructions';
import { countInWords, PatternAnswer, PatternBar } from './PatternAnswer';
import { PatternField } from './PatternField';
import { PatternOptions } from './PatternOptions';
import { PatternSettings } from './PatternSettings';
import { sizeCount } from './patternSizes';
import { READ_ONLY_ONCE, type MotifIdentity } from './planMotif';
import { nextProblem, Problems } from './Problems';
import { ReadRounds } from './ReadRounds';
import type { PatternDraft } from './usePatternDraft';
import { usePatternReading } from './usePatternReading';
import { usePlanning, type Planning } from './usePlanning';

/** Fetched once there is something to draw. */
const SymbolChart = lazy(async () => ({
  default: (await import('../../chart/SymbolChart')).SymbolChart,
}));

const DRAWING = <p className="min-h-130 text-ink-2">Drawing the chart …</p>;

/** What the sections below the rounds are of. */
export interface ShownMotif {
  motif: Motif;
  gauge: Gauge;
  gaugeChoice: GaugeChoice | undefined;
  units: Units;
  terms: Terms;
  /** Goes to the estimator with what a made one has told. */
  onPlan: Planning['plan'];
}

export interface PatternEditorProps {
  pattern: PatternDraft;
  /** None where the pattern is only looked at. */
  onChange: ((change: Partial<PatternDraft>) => void) | null;
  /** The person's own choices, for everything but the text. */
  units: Units;
  shownTerms: Terms;
  swatches: GaugeSwatch[];
  ownStitches?: readonly OwnStitch[];
  /** Which motif it is when a blanket is planned of it. */
  identity?: MotifIdentity;
  /** Rounds to begin with; all without it. */
  firstRounds?: number;
  /** Below the problems: the stitches of the person's own, given what writes one into the text. */
  stitchesPanel?: (onInsert: (abbreviation: string) => void) => ReactNode;
  /** Takes a word that is not understood for a stitch of the person's own. */
  onAddStitch?: (word: string) => void;
  /** Above the text, such as the motif's name. */
  heading?: ReactNode;
  /** Acts beside "Plan a blanket", such as keeping the motif. */
  actions?: ReactNode;
  /** Below the rounds, of the motif as it is worked. */
  below?: (shown: ShownMotif) => ReactNode;
}

type Panel = 'text' | 'chart' | 'rounds';
const PANELS = [
  { value: 'text', word: 'Text' },
  { value: 'chart', word: 'Chart' },
  { value: 'rounds', word: 'Rounds' },
] as const;

/** A pattern read as it is typed: its problems, its chart, its rounds, and a clean page of it. */
export function PatternEditor(props: PatternEditorProps) {
  const { pattern, onChange, swatches, ownStitches, identity = READ_ONLY_ONCE } = props;
  const { heading, actions, stitchesPanel, onAddStitch, below, firstRounds = null } = props;
  const { name, text, terms, sides, size } = pattern;
  const units = useUnits(props.units);
  const shownTerms = useTerms(props.shownTerms);
  const [panel, setPanel] = useState<Panel>('text');
  const [lit, setLit] = useState<Span | null>(null);
  const [litRound, setLitRound] = useState<number | null>(null);
  const [offset, setOffset] = useState<number | null>(null);
  const isHere = useIsHere();
  const field = useRef<HTMLTextAreaElement>(null);
  const problemsId = useId();
  /** Terms of the texts that were rewritten, so that undoing the rewriting brings them back too. */
  const rewritten = useRef(new Map<string, Terms>());

  const read = usePatternReading({ pattern, ownStitches, swatches, units, firstRounds });
  const { reading, readText, shown, motif, geometry, gauge } = read;
  const instructions = useMemo(() => instructionSpans(reading), [reading]);
  const at = useDeferredValue(offset);
  const marked = useMemo(() => {
    if (litRound !== null) return stitchesOfRound(shown, litRound);
    return at === null ? [] : stitchesAt(shown, at);
  }, [shown, at, litRound]);
  // Chart and table are drawn again only with a new reading, and so must be given the same functions.
  const lightStitch = useCallback(
    (to: StitchAddress | null) =>
      setLit(to && (shown.rounds[to.round]?.stitches[to.stitch]?.span ?? shown.ring.span)),
    [shown],
  );
  const lightRound = useCallback(
    (round: number | null) => {
      setLitRound(round);
      setLit(round === null ? null : (shown.rounds[round]?.span ?? null));
    },
    [shown],
  );
  const go = useCallback(({ begin, end }: Span) => {
    setPanel('text');
    requestAnimationFrame(() => {
      field.current?.focus();
      field.current?.setSelectionRange(begin, end);
      document.querySelector(`[data-begin="${begin}"]`)?.scrollIntoView({ block: 'nearest' });
    });
  }, []);
  const goToRound = useCallback(({ span }: WorkedRound) => go(span), [go]);
  const planning = usePlanning(shown, name, identity);
  const sizes = sizeCount(reading.pattern);
  const isEmpty = shown.rounds.length === 0;
  const only = (which: Panel) =>
    classNames('min-w-0 print:block', panel !== which && 'max-lg:hidden');

  function edit(begin: number, end: number, replacement: string) {
    if (field.current) editText(field.current, begin, end, replacement);
  }

  function convert() {
    const other = terms === 'us' ? 'uk' : 'us';
    const converted = convertTerms(text, terms, other);
    rewritten.current.set(text, terms).set(converted, other);
    edit(0, text.length, converted);
    onChange?.({ terms: other });
  }

  function insert(abbreviation: string) {
    const { selectionStart = text.length, selectionEnd = text.length } = field.current ?? {};
    edit(selectionStart, selectionEnd, abbreviation);
  }

  function goToNext(back = false) {
    const from = field.current?.selectionStart ?? 0;
    const next = nextProblem(reading.diagnostics, from, back);
    if (next) go(next);
  }

  function onKeyDown(event: KeyboardEvent) {
    if (event.key !== 'F8' || reading.diagnostics.length === 0) return;
    event.preventDefault();
    goToNext(event.shiftKey);
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
          {onChange && (
            <PatternOptions
              {...{ terms, sides, size, sizes }}
              onTerms={(next) => onChange({ terms: next })}
              onSides={(next) => onChange({ sides: next })}
              onSize={(next) => onChange({ size: next })}
              onConvert={text.trim() === '' ? null : convert}
            />
          )}
          <PatternField
            {...{ text, readText, instructions, lit, onKeyDown }}
            fieldRef={field}
            problems={reading.diagnostics}
            onText={
              onChange &&
              ((next) => {
                const known = rewritten.current.get(next);
                onChange({ text: next, ...(known && { terms: known }) });
              })
            }
            onOffset={setOffset}
            describedBy={problemsId}
          />
          {text.trim() !== '' && (
            <Problems
              id={problemsId}
              problems={reading.diagnostics}
              onGo={go}
              onNext={goToNext}
              onFix={onChange && (({ begin, end, replacement }) => edit(begin, end, replacement))}
              onAddStitch={
                onAddStitch && (({ begin, end }) => onAddStitch(readText.slice(begin, end)))
              }
            />
          )}
          {stitchesPanel?.(insert)}
        </div>
        <div className={only('chart')}>
          <div className="mb-3 flex flex-wrap items-end justify-between gap-3">
            <PatternAnswer reading={shown} {...{ geometry, units, planning, actions }} />
            {!isEmpty && <PatternSettings {...read} />}
          </div>
          {!isEmpty && !isHere && DRAWING}
          {!isEmpty && isHere && (
            <Suspense fallback={DRAWING}>
              <SymbolChart
                {...{ gauge, name, units, marked }}
                reading={shown}
                terms={shownTerms}
                ownStitches={ownStitches}
                onPoint={lightStitch}
              />
            </Suspense>
          )}
        </div>
      </div>
      {!isEmpty && (
        <div className={only('rounds')}>
          <section aria-labelledby="read-rounds" className="mt-10">
            <h2 id="read-rounds" className="mb-2">
              Rounds
            </h2>
            <ReadRounds
              {...{ reading: shown, geometry, gauge, units }}
              terms={shownTerms}
              onRound={lightRound}
              onGo={goToRound}
            />
          </section>
          {below?.({
            ...{ motif, gauge, units },
            gaugeChoice: read.gaugeChoice,
            terms: shownTerms,
            onPlan: planning.plan,
          })}
          <div className="mt-10">
            <CleanPattern
              key={terms}
              reading={reading}
              about={`A ${SHAPE_WORDS[sides]} of ${countInWords(shown)}, ${showFabric(geometry.acrossMm, units)} ${acrossWord(sides)} at the gauge of ${read.gaugeChoice?.word}.`}
              {...{ name, ownStitches }}
            />
          </div>
        </div>
      )}
      <PatternBar reading={shown} {...{ geometry, units, planning }} />
    </>
  );
}
