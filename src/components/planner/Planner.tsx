import { Download, Redo2, Undo2 } from 'lucide-react';
import { lazy, useState, type ReactNode } from 'react';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import type { Plan } from '../../lib/plan/plan';
import { showFabric, showSize, type Units } from '../../lib/units/display';
import { BlanketPicture } from '../blanket/BlanketPicture';
import { AnswerBar } from '../ui/AnswerBar';
import { Button, ButtonLink } from '../ui/Button';
import { LoadedLater } from '../ui/LoadedLater';
import { Notice } from '../ui/Notice';
import { useTerms, useUnits } from '../ui/useUnits';
import { Answer, skeinWord, sureWord } from './Answer';
import { BlanketSection } from './BlanketSection';
import { ChancePanel } from './ChancePanel';
import { ColourRows } from './ColourRows';
import { DoubtPanel } from './DoubtPanel';
import { MotifSection } from './MotifSection';
import { NextPanel } from './NextPanel';
import { PartsPanel } from './PartsPanel';
import { PlanNotices } from './PlanNotices';
import type { Terms } from './stitchWord';
import { SwatchSection } from './SwatchSection';
import { useEstimate } from './useEstimate';
import type { PlanEditing } from './usePlan';
import { WeighedSection } from './WeighedSection';
import { YarnSection } from './YarnSection';

const ColourSheet = lazy(() => import('./ColourSheet'));
const LedgerSheet = lazy(() => import('./LedgerSheet'));
const CompareSheet = lazy(() => import('./CompareSheet'));
const BorderSheet = lazy(() => import('./BorderSheet'));
const SizesSheet = lazy(() => import('./SizesSheet'));
const ShoppingSheet = lazy(() => import('./ShoppingSheet'));
const PaintSheet = lazy(() => import('./paint/PaintSheet'));

export interface PlannerPreferences {
  units: Units;
  terms: Terms;
  currency: string;
}

interface PlannerProps {
  editing: PlanEditing;
  preferences: PlannerPreferences;
  motifChoices: readonly MotifChoice[];
  /** Above the inputs: a title, or the name and the state of a saved blanket. */
  heading: ReactNode;
  /** Beside undo and redo: how the plan is kept. */
  keeping?: ReactNode;
  /** Where the shopping list of a saved blanket is; without it the list opens here. */
  shoppingHref?: string;
  /** Where a saved blanket is made motif by motif. */
  makingHref?: string;
}

type OpenSheet =
  'none' | 'colours' | 'paint' | 'ledger' | 'compare' | 'sizes' | 'border' | 'shopping';

/** The estimator: inputs left, the answer and the picture right; everything recomputed at each change. */
export function Planner(props: PlannerProps) {
  const { editing, preferences, motifChoices, heading, keeping, shoppingHref, makingHref } = props;
  const { plan, change } = editing;
  const units = useUnits(preferences.units);
  const terms = useTerms(preferences.terms);
  const { estimate, impossible } = useEstimate(plan, editing.initial);
  const [sheet, setSheet] = useState<OpenSheet>('none');
  const [ledgerColour, setLedgerColour] = useState('all');
  const [picked, setPicked] = useState<string | null>(null);
  const chosen = picked ?? leastCertain(plan, estimate.colours);
  const close = () => setSheet('none');
  const openLedger = (colour: string) => {
    setLedgerColour(colour);
    setSheet('ledger');
  };
  const shared = { plan, estimate, units, change };

  return (
    <>
      <div className="lg:grid lg:grid-cols-[minmax(22rem,25rem)_1fr]">
        <form
          className="grid content-start gap-5 px-4 pt-6 pb-8 lg:sticky lg:top-0 lg:h-dvh lg:overflow-y-auto lg:border-e lg:border-line lg:px-8"
          onSubmit={(event) => event.preventDefault()}
          aria-label="The plan"
        >
          {heading}
          <HistoryBar editing={editing} keeping={keeping} />
          <YarnSection {...shared} terms={terms} currency={preferences.currency} />
          <SwatchSection {...shared} terms={terms} />
          <WeighedSection {...shared} />
          <MotifSection
            {...shared}
            terms={terms}
            choices={motifChoices}
            onColours={() => setSheet('colours')}
          />
          <BlanketSection
            {...shared}
            terms={terms}
            choices={motifChoices}
            onBorder={() => setSheet('border')}
          />
        </form>
        <div className="grid content-start gap-8 px-4 pt-6 pb-10 lg:px-9" data-answer>
          {impossible && (
            <Notice kind="problem" title="These figures cannot be worked out" live>
              The last ones that could are shown. Undo, or look for a number that is out of all
              proportion.
            </Notice>
          )}
          <Answer {...shared} />
          <ColourRows {...shared} chosen={chosen} onChoose={setPicked} onLedger={openLedger} />
          <div className="grid gap-8 xl:grid-cols-[minmax(0,1.35fr)_minmax(17rem,1fr)]">
            <div className="grid min-w-0 content-start gap-6">
              <FinishedSize {...shared} />
              <div className="flex flex-wrap gap-3" data-chrome>
                <ShoppingButton href={shoppingHref} onOpen={() => setSheet('shopping')} />
                {makingHref && <ButtonLink href={makingHref}>Make it</ButtonLink>}
                <Button onClick={() => setSheet('paint')}>Paint it</Button>
                <Button onClick={() => setSheet('compare')}>Compare joins</Button>
                <Button onClick={() => setSheet('sizes')}>Several sizes</Button>
                <Button onClick={() => openLedger('all')}>Open the ledger</Button>
              </div>
              <PlanNotices notices={estimate.notices} {...{ plan, change }} />
            </div>
            <div className="grid content-start gap-7">
              <ChancePanel {...shared} chosen={chosen} />
              <NextPanel {...shared} />
              <DoubtPanel {...shared} />
              <PartsPanel {...shared} />
            </div>
          </div>
        </div>
      </div>
      <AnswerBar
        answer={skeinWord(estimate.totals.skeins)}
        detail={`${sureWord(plan.confidence)} sure · ${showSize(estimate.size.widthMm, estimate.size.heightMm, units)}`}
        action={<ShoppingButton href={shoppingHref} onOpen={() => setSheet('shopping')} />}
      />
      <LoadedLater what="This part">
        {sheet === 'colours' && <ColourSheet {...shared} choices={motifChoices} onClose={close} />}
        {sheet === 'ledger' && (
          <LedgerSheet
            {...shared}
            terms={terms}
            colour={ledgerColour}
            onColour={setLedgerColour}
            onClose={close}
          />
        )}
        {sheet === 'paint' && <PaintSheet {...shared} editing={editing} onClose={close} />}
        {sheet === 'compare' && (
          <CompareSheet
            {...shared}
            terms={terms}
            inAccount={shoppingHref !== undefined}
            onClose={close}
          />
        )}
        {sheet === 'border' && <BorderSheet {...shared} terms={terms} onClose={close} />}
        {sheet === 'sizes' && <SizesSheet {...shared} onClose={close} />}
        {sheet === 'shopping' && <ShoppingSheet {...shared} onClose={close} />}
      </LoadedLater>
    </>
  );
}

/** The colour whose need is least certain: the first one worth looking at. */
function leastCertain(plan: Plan, colours: readonly { colour: string; sdM: number }[]): string {
  const [first] = colours.toSorted((left, right) => right.sdM - left.sdM);
  return first?.colour ?? plan.colours[0]?.key ?? '';
}

function HistoryBar({ editing, keeping }: { editing: PlanEditing; keeping?: ReactNode }) {
  const { undo, redo, canUndo, canRedo } = editing;
  return (
    <div className="-ms-2 flex flex-wrap items-center gap-1" data-chrome>
      <Button kind="quiet" small icon={Undo2} onClick={undo} disabled={!canUndo} title="Ctrl+Z">
        Undo
      </Button>
      <Button
        kind="quiet"
        small
        icon={Redo2}
        onClick={redo}
        disabled={!canRedo}
        title="Ctrl+Shift+Z"
      >
        Redo
      </Button>
      <span className="ms-auto">{keeping}</span>
    </div>
  );
}

function ShoppingButton({ href, onOpen }: { href?: string; onOpen: () => void }) {
  if (!href) {
    return (
      <Button kind="primary" onClick={onOpen}>
        Shopping list
      </Button>
    );
  }
  return (
    <a className="btn btn-primary" href={href}>
      Shopping list
    </a>
  );
}

function FinishedSize({ plan, estimate, units }: Parameters<typeof BlanketPicture>[0]) {
  const { size, rows, columns } = estimate;
  return (
    <div className="min-w-0">
      <BlanketPicture {...{ plan, estimate, units }} maxHeightPx={560} />
      <p className="mt-2">
        <b className="text-lg">{showSize(size.widthMm, size.heightMm, units)}</b> finished,{' '}
        {columns} × {rows} motifs, joins and border included. Give or take{' '}
        {showFabric(1.96 * size.widthSdMm, units)} by {showFabric(1.96 * size.heightSdMm, units)}
        {plan.motifSideMm === null && ': measure a finished motif to narrow that'}.
      </p>
      <div className="-ms-3 flex flex-wrap" data-chrome>
        {(['png', 'svg'] as const).map((as) => (
          <Button
            key={as}
            kind="quiet"
            small
            icon={Download}
            onClick={() => {
              void import('../blanket/downloadPicture').then(({ downloadPicture }) =>
                downloadPicture(plan, estimate, as),
              );
            }}
          >
            Picture as {as.toUpperCase()}
          </Button>
        ))}
      </div>
    </div>
  );
}
