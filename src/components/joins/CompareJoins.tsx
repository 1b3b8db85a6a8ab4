import { Printer } from 'lucide-react';
import { lazy, useMemo, useState } from 'react';
import { download } from '../../client/download';
import { compareTensions, type JoinComparison } from '../../lib/joins/compareJoins';
import { READY_JOINS } from '../../lib/joins/readyJoins';
import { whyCheapest } from '../../lib/joins/whyCheapest';
import { whyInWords } from '../../lib/joins/whyInWords';
import type { Terms } from '../../lib/pattern/reading';
import type { Plan } from '../../lib/plan/plan';
import type { GaugeSwatch } from '../../lib/swatches/swatchRecord';
import type { Units } from '../../lib/units/display';
import { Button } from '../ui/Button';
import { DataTable } from '../ui/DataTable';
import { LoadedLater } from '../ui/LoadedLater';
import { printSheet } from '../ui/printSheet';
import { Select } from '../ui/Select';
import { Skeleton } from '../ui/Skeleton';
import { useIsHere } from '../ui/useIsHere';
import { joinColumns } from './joinColumns';
import { JoinChoice } from './JoinChoice';
import { JoinPictures } from './JoinPictures';
import { joinsCsv } from './joinsCsv';
import { OWN_TENSION, type Tension } from './tension';
import { TensionChoice } from './TensionChoice';
import { TensionsTable } from './TensionsTable';

const JoinsChart = lazy(() => import('./JoinsChart'));

interface CompareJoinsProps {
  plan: Plan;
  units: Units;
  terms: Terms;
  /** Swatches kept in the account, to compare hands by. */
  kept?: readonly GaugeSwatch[];
  /** Takes a join over into the plan. */
  onUse?: (key: string) => void;
}

const NONE: never[] = [];

/** Joins tried on one blanket, for one hand or several: reason, chart, tables and pictures. */
export default function CompareJoins({
  plan,
  units,
  terms,
  kept = NONE,
  onUse,
}: CompareJoinsProps) {
  const [keys, setKeys] = useState(() => READY_JOINS.map(({ key }) => key));
  const [tensions, setTensions] = useState<readonly Tension[]>([OWN_TENSION]);
  const [shownId, setShownId] = useState(OWN_TENSION.id);
  const isHere = useIsHere();
  const joins = useMemo(() => READY_JOINS.filter(({ key }) => keys.includes(key)), [keys]);
  const compared = useMemo(
    () =>
      compareTensions(
        plan,
        joins,
        tensions.map(({ swatch }) => swatch),
      ),
    [plan, joins, tensions],
  );
  const shown = Math.max(
    0,
    tensions.findIndex(({ id }) => id === shownId),
  );
  const shared = { tensions, compared, plan, units };
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-6 pb-4" data-sheet>
      <h1 className="sheet-shown hidden">Joins compared in {plan.yarn.name}</h1>
      <div className="not-printed grid gap-2">
        <JoinChoice chosen={keys} onChoose={setKeys} />
        <TensionChoice {...{ tensions, kept, units }} onChoose={setTensions} />
      </div>
      {joins.length === 0 ? (
        <p>Choose at least one join.</p>
      ) : (
        <>
          <Reasons {...{ tensions, compared, units, terms }} />
          <LoadedLater
            what="The chart"
            fallback={<Skeleton label="The chart is loading" lines={6} />}
          >
            {isHere && <JoinsChart {...shared} />}
          </LoadedLater>
          <div>
            <div className="not-printed mb-3 flex flex-wrap items-end gap-3">
              {tensions.length > 1 && (
                <Select
                  className="w-60"
                  label="Figures at the tension of"
                  value={tensions[shown]?.id}
                  onChange={({ target }) => setShownId(target.value)}
                  options={tensions.map(({ id, name }) => ({ value: id, word: name }))}
                />
              )}
              <Button icon={Printer} onClick={printSheet}>
                Print
              </Button>
            </div>
            <DataTable
              caption={`Joins at the tension of ${inSentence(tensions[shown])}`}
              captionHidden={tensions.length === 1}
              rows={compared[shown] ?? NONE}
              columns={joinColumns(plan, units, onUse)}
              rowId={({ join }) => join.key}
              initialSorting={[{ id: 'join yarn', desc: false }]}
              empty={<p>No join is chosen.</p>}
              pageSize={40}
              onExportCsv={(rows) =>
                download('joins.csv', 'text/csv', joinsCsv(inOrder(rows, compared, tensions)))
              }
            />
          </div>
          {tensions.length > 1 && <TensionsTable {...shared} />}
          <JoinPictures {...{ plan, joins, units }} />
        </>
      )}
    </div>
  );
}

interface ReasonsProps {
  tensions: readonly Tension[];
  compared: readonly (readonly JoinComparison[])[];
  units: Units;
  terms: Terms;
}

/** Why the thriftiest join is: once for each hand for which that is another sentence. */
function Reasons({ tensions, compared, units, terms }: ReasonsProps) {
  return (
    <div className="grid max-w-[70ch] gap-1" aria-live="polite">
      {tensions.map(({ id, name }, i) => {
        const why = whyCheapest(compared[i] ?? NONE);
        if (!why) return null;
        return (
          <p key={id}>
            {tensions.length > 1 && <b>{name}: </b>}
            {whyInWords(why, units, terms)}
          </p>
        );
      })}
    </div>
  );
}

const inSentence = (tension: Tension | undefined): string =>
  !tension || tension.id === OWN_TENSION.id ? 'this plan' : tension.name;

/** Every tension's rows, in the order that the table shows. */
const inOrder = (
  rows: readonly JoinComparison[],
  compared: readonly (readonly JoinComparison[])[],
  tensions: readonly Tension[],
) =>
  tensions.map(({ name }, i) => ({
    tension: name,
    rows: rows.flatMap(({ join }) => compared[i]?.find((each) => each.join.key === join.key) ?? []),
  }));
