import { PencilLine } from 'lucide-react';
import { ButtonLink } from '../../ui/Button';
import { PatternEditor } from '../pattern/PatternEditor';
import { BelowMotif } from './BelowMotif';
import type { MotifPageProps } from './MotifPage';

/** Rounds that a ready-made motif is shown with: most can be worked to many more. */
const FIRST_ROUNDS = 4;

/** A ready-made motif: to look at, to plan, to change as one's own. */
export function ReadyMotif(props: MotifPageProps) {
  const { presented, swatches, made, signedIn, units, terms } = props;
  const { key, pattern, version } = presented;
  return (
    <PatternEditor
      pattern={pattern}
      onChange={null}
      {...{ swatches, units }}
      shownTerms={terms}
      identity={{ key, version }}
      firstRounds={FIRST_ROUNDS}
      actions={
        <ButtonLink icon={PencilLine} href={`/motifs/read?from=${key}`}>
          Change it as my own
        </ButtonLink>
      }
      below={(shown) => (
        <BelowMotif {...{ shown, made, signedIn }} motifKey={key} motifVersion={version} />
      )}
    />
  );
}
