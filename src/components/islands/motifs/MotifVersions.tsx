import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { getMotifVersion, motifVersionsQuery } from '../../../client/queries/motifs';
import type { PresentedMotif, PresentedMotifVersion } from '../../../schemas/motif';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { Disclosure } from '../../ui/Disclosure';
import { Notice } from '../../ui/Notice';
import { failureWords } from '../form/formErrors';
import { problemCountInWords, savedOn } from './motifWording';
import { TextChanges } from './TextChanges';

interface MotifVersionsProps {
  motifKey: string;
  initial: PresentedMotifVersion[];
  /** The text on the screen, that an older one is compared with. */
  text: string;
  isBusy: boolean;
  onRestore: (version: number) => void;
}

/** Every save of a motif: when, how many rounds, what has changed since, and back to it. */
export function MotifVersions(props: MotifVersionsProps) {
  const { motifKey, initial, text, isBusy, onRestore } = props;
  const { data: versions } = useQuery({ ...motifVersionsQuery(motifKey), initialData: initial });
  const [looked, setLooked] = useState<PresentedMotif | null>(null);
  const [failure, setFailure] = useState<string | null>(null);

  async function look(version: number) {
    try {
      setFailure(null);
      setLooked(await getMotifVersion(motifKey, version));
    } catch (error) {
      setFailure(failureWords(error));
    }
  }

  return (
    <Disclosure className="not-printed mt-3" summary={`Versions: ${versions.length}`}>
      {failure && (
        <Notice kind="problem" live>
          {failure}
        </Notice>
      )}
      <ul>
        {versions.map(({ version, name, savedAt, isCurrent, rounds, problems }) => (
          <li
            key={version}
            className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 border-t border-line py-2 first:border-t-0"
          >
            <span>
              <b>Version {version}</b> {name}
              <span className="block text-sm text-ink-2">
                {savedOn(savedAt)}, {rounds === 1 ? '1 round' : `${rounds} rounds`}
                {problemCountInWords(problems, ', ')}
              </span>
            </span>
            {isCurrent ? (
              <span className="text-sm text-ink-2">the newest</span>
            ) : (
              <Button small onClick={() => void look(version)}>
                What has changed
              </Button>
            )}
          </li>
        ))}
      </ul>
      {looked && (
        <Dialog
          open
          onOpenChange={(open) => !open && setLooked(null)}
          title={`Since version ${looked.version}`}
          description={`What the text on the screen says otherwise than “${looked.name}” did, saved ${savedOn(looked.updatedAt ?? '')}.`}
          actions={
            <>
              <Button
                kind="primary"
                busy={isBusy && 'Saving…'}
                onClick={() => {
                  onRestore(looked.version ?? 1);
                  setLooked(null);
                }}
              >
                Take version {looked.version} up again
              </Button>
              <Button onClick={() => setLooked(null)}>Leave it</Button>
            </>
          }
        >
          <TextChanges before={looked.pattern.text} after={text} />
        </Dialog>
      )}
    </Disclosure>
  );
}
