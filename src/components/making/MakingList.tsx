import { motifKeyOf } from '../../lib/making/madeMotifs';
import { motifInstructions, placeWords } from '../../lib/making/motifInstructions';
import type { JoiningStep } from '../../lib/joining/joiningSteps';
import type { BlanketMotif } from '../../lib/plan/blanketFaces';
import type { Plan } from '../../lib/plan/plan';
import { Button } from '../ui/Button';
import { capital } from './makingWords';

interface MakingListProps {
  plan: Plan;
  motifs: readonly BlanketMotif[];
  steps: readonly JoiningStep[];
  made: ReadonlySet<string>;
  onChoose: (face: number) => void;
}

/** Every motif in its order: to look ahead, and to print. */
export function MakingList({ plan, motifs, steps, made, onChoose }: MakingListProps) {
  return (
    <table className="w-full text-sm">
      <caption className="sr-only">Every motif in the order of making</caption>
      <thead>
        <tr className="text-start text-ink-2">
          {['', 'Motif', 'Colourway', 'Links'].map((head) => (
            <th key={head} scope="col" className="py-1 pe-3 text-start font-normal">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {steps.map((step, i) => {
          const motif = motifs[step.face] as BlanketMotif;
          const isMade = made.has(motifKeyOf(motif.face));
          const { links } = motifInstructions(plan, motifs, step);
          return (
            <tr key={step.face} className="border-t border-line align-top">
              <td className="figures py-1.5 pe-3">
                {i + 1}
                {isMade && ' ✓'}
                <span className="sr-only">{isMade ? ' made' : ''}</span>
              </td>
              <th scope="row" className="py-1.5 pe-3 text-start font-bold whitespace-nowrap">
                <Button kind="quiet" small className="-ms-3" onClick={() => onChoose(step.face)}>
                  {capital(placeWords(motifs, step.face))}
                </Button>
              </th>
              <td className="py-1.5 pe-3">{motif.colourway + 1}</td>
              <td className="py-1.5">
                {links.length === 0
                  ? 'none yet'
                  : links.map(({ where, what }) => `${where}: ${what}`).join('; ')}
              </td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
