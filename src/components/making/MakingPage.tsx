import { CloudOff, Printer } from 'lucide-react';
import { useEffect, useMemo, useState } from 'react';
import { joiningSteps } from '../../lib/joining/joiningSteps';
import { makingOrder, MAKING_ORDERS, type MakingOrder } from '../../lib/joining/makingOrder';
import { readyJoin } from '../../lib/joins/readyJoins';
import { estimate as estimateOf } from '../../lib/ledger/estimate';
import { madePlaces, motifKeyOf } from '../../lib/making/madeMotifs';
import { makingYarn } from '../../lib/making/makingYarn';
import { motifInstructions, placeWords } from '../../lib/making/motifInstructions';
import { workedSoFar } from '../../lib/making/workedSoFar';
import { blanketFaces } from '../../lib/plan/blanketFaces';
import type { Plan } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import type { Making } from '../../schemas/making';
import { Button, ButtonLink } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Disclosure } from '../ui/Disclosure';
import { Notice } from '../ui/Notice';
import { Select } from '../ui/Select';
import { useIsHere } from '../ui/useIsHere';
import { useUnits } from '../ui/useUnits';
import { CurrentMotif } from './CurrentMotif';
import { MakingList } from './MakingList';
import { MakingMap } from './MakingMap';
import { capital, colourName, ORDER_WORDS } from './makingWords';
import { SendWords } from './SendWords';
import { useMaking } from './useMaking';
import { useOffline } from './useOffline';
import { useScreenAwake } from './useScreenAwake';
import { WeighDialog } from './WeighDialog';
import { YarnLeft } from './YarnLeft';

interface MakingPageProps {
  blanketId: string;
  title: string;
  plan: Plan;
  making: Making;
  units: Units;
}

/** The blanket motif by motif: what to work and link now, what is made, and whether the yarn will do. */
export default function MakingPage({
  blanketId,
  title,
  plan,
  making: initial,
  units: first,
}: MakingPageProps) {
  const units = useUnits(first);
  const making = useMaking(blanketId, initial);
  const { made, order, weighings } = making;
  const isHere = useIsHere();
  const [awake, setAwake] = useState(true);
  useOffline();
  const isAwake = useScreenAwake(awake);

  const estimate = useMemo(() => estimateOf(plan), [plan]);
  const { motifs, map } = blanketFaces(plan, estimate);
  const steps = useMemo(() => {
    const faces = motifs.map(({ face }) => face);
    const byOrder = makingOrder(estimate.layout, faces, map(), order);
    return joiningSteps(estimate.layout, faces, map(), byOrder, plan.corners);
  }, [motifs, map, estimate, order, plan.corners]);
  const isMade = (step: number): boolean => {
    const face = motifs[steps[step]?.face ?? -1]?.face;
    return face !== undefined && made.has(motifKeyOf(face));
  };
  const next = nextAfter(steps.length, -1, isMade);
  const [chosen, setChosen] = useState<number | null>(null);
  const at = Math.min(chosen ?? next ?? steps.length - 1, steps.length - 1);
  const step = steps[at];

  const worked = useMemo(
    () => workedSoFar(plan, madePlaces(motifs, made, plan.colourways.length)),
    [plan, motifs, made],
  );
  const progress = useMemo(() => makingYarn(plan, worked, weighings), [plan, worked, weighings]);
  const [weighed, setWeighed] = useState<string | null>(null);
  const [listed, setListed] = useState(false);
  const printing = usePrinting(() => setListed(true));

  if (!step) return null;
  const motif = motifs[step.face];
  const key = motif ? motifKeyOf(motif.face) : '';
  const madeCount = motifs.filter(({ face }) => made.has(motifKeyOf(face))).length;
  const choose = (face: number) => setChosen(steps.findIndex((each) => each.face === face));
  const asWorked = readyJoin(plan.join.key)?.attached !== 'line';

  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-6 pb-24">
      <header className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div>
          <a className="link text-sm" href={`/blankets/${blanketId}`}>
            {title}
          </a>
          <h1>
            {madeCount} of {motifs.length} motifs made
          </h1>
          <SendWords state={making.state} unsent={making.unsent} />
        </div>
        <div className="flex flex-wrap items-end gap-3" data-chrome>
          <Select
            className="w-64"
            label="In which order"
            value={order}
            onChange={({ target }) => {
              making.setOrder(target.value as MakingOrder);
              setChosen(null);
            }}
            options={MAKING_ORDERS.filter((each) => asWorked || each !== 'continuous').map(
              (each) => ({ value: each, word: capital(ORDER_WORDS[each]) }),
            )}
          />
          <Checkbox
            label="Keep the screen on"
            hint={isHere && awake && !isAwake ? 'This browser does not' : undefined}
            checked={awake}
            onChange={({ target }) => setAwake(target.checked)}
          />
        </div>
      </header>
      <div className="grid grid-cols-[minmax(0,1fr)] gap-8 lg:grid-cols-2">
        {madeCount === motifs.length && chosen === null ? (
          <Notice title="All motifs are made">
            What is left: {asWorked ? '' : 'the seams, '}the border, and weaving in the ends.
          </Notice>
        ) : (
          <CurrentMotif
            plan={plan}
            place={placeWords(motifs, step.face)}
            motifName={`${plan.motifs[plan.colourways[motif?.colourway ?? 0]?.motifIndex ?? 0]?.name ?? ''}, colourway ${(motif?.colourway ?? 0) + 1}`}
            instructions={motifInstructions(plan, motifs, step)}
            isMade={isMade(at)}
            onMade={() => {
              making.tick(key, true);
              setChosen(nextAfter(steps.length, at, isMade));
            }}
            onNotMade={() => making.tick(key, false)}
            onBack={at > 0 ? () => setChosen(at - 1) : null}
            onSkip={at < steps.length - 1 ? () => setChosen(at + 1) : null}
          />
        )}
        <div className="grid content-start gap-8">
          <MakingMap
            {...{ plan, estimate, units, motifs, made }}
            current={step.face}
            onChoose={choose}
          />
          <YarnLeft {...{ plan, units, progress }} onWeigh={setWeighed} />
        </div>
      </div>
      <div className="flex flex-wrap items-center gap-3" data-chrome>
        <Button icon={Printer} onClick={printing}>
          Print the order
        </Button>
        <ButtonLink kind="quiet" href={`/blankets/${blanketId}`}>
          Change the plan
        </ButtonLink>
        {isHere && 'serviceWorker' in navigator && (
          <span className="inline-flex items-center gap-1.5 text-sm text-ink-2">
            <CloudOff size={15} aria-hidden /> This page opens without a connection, too.
          </span>
        )}
      </div>
      <Disclosure summary="The whole order as a list" open={listed} onToggle={setListed}>
        {listed && <MakingList {...{ plan, motifs, steps, made }} onChoose={choose} />}
      </Disclosure>
      {weighed !== null && (
        <WeighDialog
          colour={weighed}
          name={colourName(plan, weighed)}
          begunG={
            weighings.some(({ colour }) => colour === weighed)
              ? null
              : (estimate.colours.find(({ colour }) => colour === weighed)?.skeins ?? 0) *
                plan.yarn.putUp.massG
          }
          worked={wholeStitches(worked.get(weighed))}
          onWeigh={making.weigh}
          onClose={() => setWeighed(null)}
        />
      )}
    </div>
  );
}

/** The first step after `at` that is not made, going round; null when all are. */
function nextAfter(count: number, at: number, isMade: (step: number) => boolean): number | null {
  for (let i = 1; i <= count; i += 1) {
    const step = (at + i) % count;
    if (step !== at && !isMade(step)) return step;
  }
  return null;
}

/** Halves of motifs leave fractions of stitches: kept as whole ones. */
const wholeStitches = (
  worked: { made: Readonly<Record<string, number>>; tails: number } | undefined,
): { made: Record<string, number>; tails: number } => ({
  made: Object.fromEntries(
    Object.entries(worked?.made ?? {}).map(([code, count]) => [code, Math.round(count)]),
  ),
  tails: Math.round(worked?.tails ?? 0),
});

/** Prints once what is to be printed is on the page. */
function usePrinting(prepare: () => void): () => void {
  const [wanted, setWanted] = useState(false);
  useEffect(() => {
    if (!wanted) return;
    setWanted(false);
    window.print();
  }, [wanted]);
  return () => {
    prepare();
    setWanted(true);
  };
}
