import { useMutation } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { lazy, useState } from 'react';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import type { Terms } from '../../planner/stitchWord';
import { Button } from '../../ui/Button';
import { capitalised, countInWords } from '../../ui/inWords';
import { LoadedLater } from '../../ui/LoadedLater';
import { Notice } from '../../ui/Notice';
import { failureWords } from '../form/formErrors';
import { StaleNotice } from '../form/StaleNotice';
import { DeleteStitch } from './DeleteStitch';
import type { KeptStitch } from './keptStitch';
import { StitchItem } from './StitchItem';
import type { OwnStitchesState } from './useOwnStitches';

const StitchSheet = lazy(() => import('./StitchSheet'));

export interface OwnStitchesPanelProps extends OwnStitchesState {
  terms: Terms;
  /** Abbreviations that the text beside it uses. */
  usedAbbreviations?: readonly string[];
  /** Writes an abbreviation into the text, where the cursor stands. */
  onInsert?: (abbreviation: string) => void;
}

/** A stitch to look at and change. */
const EXAMPLE: Partial<OwnStitch> = {
  abbreviation: 'bul',
  name: 'bullion of seven wraps',
  moves: { wraps: 7, draws: 1, throughs: 1 },
  symbol: { body: 'legs', legs: 1, bars: 5 },
};

/**
 * The stitches of the person's own, and the form to write one. Takes what `useOwnStitches` gives; the
 * form lies over the page, so the panel may stand in something that is closed.
 */
export function OwnStitchesPanel(props: OwnStitchesPanelProps) {
  const { kept, signedIn, writing, write, terms, usedAbbreviations = [], onInsert } = props;
  const [added, setAdded] = useState<KeptStitch | null>(null);
  const [leaving, setLeaving] = useState<KeptStitch | null>(null);
  const isUsed = ({ abbreviation }: KeptStitch) => usedAbbreviations.includes(abbreviation);
  const begin = (begins: Partial<OwnStitch>) => write({ kept: null, begins });

  function close(saved: KeptStitch | null, wasNew = false) {
    write(null);
    setAdded(wasNew ? saved : null);
  }

  return (
    <div>
      <StaleNotice error={props.error} onRetry={props.retry} />
      <LeftOnDevice {...props} />
      {kept.length > 0 ? (
        <ul aria-label="Stitches of your own">
          {kept.map((each) => (
            <StitchItem
              key={each.id}
              kept={each}
              isUsed={isUsed(each)}
              onInsert={onInsert}
              onEdit={() => write({ kept: each })}
              onDelete={() => setLeaving(each)}
            />
          ))}
        </ul>
      ) : (
        <p className="max-w-[56ch]">
          A stitch that no list of abbreviations has is read like any other once you say how it is
          made: its wraps, draws and throughs.
        </p>
      )}
      <p role="status" className="text-sm text-ink-2 empty:hidden">
        {added && `${added.abbreviation} is read from now on.`}
      </p>
      <div className="mt-2 flex flex-wrap items-center gap-x-3 gap-y-2">
        <Button icon={Plus} onClick={() => begin({})}>
          Add a stitch
        </Button>
        {kept.length === 0 && (
          <Button kind="quiet" onClick={() => begin(EXAMPLE)}>
            Begin with an example
          </Button>
        )}
      </div>
      {!signedIn && kept.length > 0 && (
        <p className="mt-2 text-sm text-ink-2">
          Kept on this device.{' '}
          <a className="link font-normal" href="/sign-in">
            Sign in
          </a>{' '}
          to have them everywhere.
        </p>
      )}
      {writing && (
        <LoadedLater what="The form for a stitch">
          <StitchSheet
            key={writing.kept?.id ?? 'new'}
            {...{ writing, terms }}
            save={props.save}
            onSaved={close}
            onClose={() => close(null)}
          />
        </LoadedLater>
      )}
      {leaving && (
        <DeleteStitch
          kept={leaving}
          isUsed={isUsed(leaving)}
          remove={props.remove}
          onClose={() => setLeaving(null)}
        />
      )}
    </div>
  );
}

/** Stitches from before the person signed in stay on the device until they are taken along. */
function LeftOnDevice({ left, takeToAccount }: OwnStitchesPanelProps) {
  const taking = useMutation({ mutationFn: takeToAccount });
  if (left.length === 0) return null;
  const are = left.length === 1 ? 'stitch is' : 'stitches are';
  return (
    <Notice
      className="mb-3"
      action={
        <Button small busy={taking.isPending && 'Taking…'} onClick={() => taking.mutate()}>
          Take into the account
        </Button>
      }
    >
      {capitalised(countInWords(left.length))} {are} on this device only:{' '}
      {left.map(({ abbreviation }) => abbreviation).join(', ')}.
      {taking.error && <span className="block text-madder">{failureWords(taking.error)}</span>}
    </Notice>
  );
}
