import { ArrowLeft, ArrowRight, Check, RotateCcw } from 'lucide-react';
import { hexOf } from '../../lib/plan/hexOf';
import { Button } from '../ui/Button';
import { WoundCard } from '../ui/WoundCard';
import type { MotifInstructions, RoundToWork } from '../../lib/making/motifInstructions';
import type { Plan } from '../../lib/plan/plan';
import { capital, colourName } from './makingWords';

interface CurrentMotifProps {
  plan: Plan;
  /** "row 2, motif 3" */
  place: string;
  motifName: string;
  instructions: MotifInstructions;
  isMade: boolean;
  onMade: () => void;
  onNotMade: () => void;
  onBack: (() => void) | null;
  onSkip: (() => void) | null;
}

/** The motif at hand, in type that can be read from the table: what to work, what to link. */
export function CurrentMotif(props: CurrentMotifProps) {
  const { plan, place, motifName, instructions, isMade, onMade, onNotMade, onBack, onSkip } = props;
  const { rounds, links, afterwards } = instructions;
  return (
    <section aria-labelledby="current-motif">
      <h2 id="current-motif" className="text-answer font-bold">
        {capital(place)}
      </h2>
      <p className="text-ink-2">{motifName}</p>
      <ol className="mt-4 grid gap-1">
        {rounds.map((round, i) => (
          <RoundLine key={i} {...{ plan, round }} goesOn={rounds[i - 1]?.colour === round.colour} />
        ))}
      </ol>
      {links.length > 0 && (
        <>
          <h3 className="mt-5 text-lg font-bold">
            {afterwards ? 'Once all motifs are made, its seams' : 'Link as you go'}
          </h3>
          <ul className="mt-1 grid gap-1 text-xl">
            {links.map(({ where, what, why }) => (
              <li key={where} className="border-t border-line py-1.5">
                <b>{capital(where)}</b>: {what}
                {why && <span className="block text-sm text-ink-2">{why}</span>}
              </li>
            ))}
          </ul>
        </>
      )}
      <div
        className="sticky bottom-0 mt-4 -mb-3 flex flex-wrap items-center gap-3 bg-ground py-3 lg:static"
        data-chrome
      >
        {isMade ? (
          <Button icon={RotateCcw} onClick={onNotMade}>
            Not made yet
          </Button>
        ) : (
          <Button kind="primary" icon={Check} onClick={onMade} className="min-h-14 px-8 text-lg">
            Made
          </Button>
        )}
        <Button kind="quiet" icon={ArrowLeft} onClick={onBack ?? undefined} disabled={!onBack}>
          Back
        </Button>
        <Button kind="quiet" icon={ArrowRight} onClick={onSkip ?? undefined} disabled={!onSkip}>
          {isMade ? 'Next' : 'Skip'}
        </Button>
      </div>
    </section>
  );
}

function RoundLine({ plan, round, goesOn }: { plan: Plan; round: RoundToWork; goesOn: boolean }) {
  return (
    <li className="flex items-center gap-3 text-xl">
      <WoundCard
        colour={hexOf(plan, round.colour)}
        weight={plan.yarn.weightCategory}
        size="sm"
        className={goesOn ? 'opacity-40' : undefined}
      />
      <span>
        <b>{round.label}</b> in {colourName(plan, round.colour)}
        {goesOn && <span className="text-ink-2"> (go on)</span>}
        <span className="text-ink-2">, {round.links ? 'linked' : 'plain'}</span>
      </span>
    </li>
  );
}
