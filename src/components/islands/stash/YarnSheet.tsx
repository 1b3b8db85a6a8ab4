import { useMutation } from '@tanstack/react-query';
import { Trash2 } from 'lucide-react';
import { deleteYarn, updateYarn, yarnContent } from '../../../client/queries/yarns';
import type { Units } from '../../../lib/units/display';
import { yarnFormSchema, type YarnForm } from '../../../schemas/stashEntry';
import type { Money, PresentedYarn } from '../../../schemas/yarn';
import type { Terms } from '../../planner/stitchWord';
import { Button } from '../../ui/Button';
import { Notice } from '../../ui/Notice';
import { differencesOf } from '../form/differences';
import { failureWords } from '../form/formErrors';
import { useVersionedForm } from '../form/useVersionedForm';
import { EditSheet } from './EditSheet';
import { yarnWording } from './stashWords';
import { YarnFields } from './YarnFields';

interface YarnSheetProps {
  yarn: PresentedYarn;
  units: Units;
  terms: Terms;
  currency: Money['currency'];
  onChange: () => void;
  onClose: () => void;
}

const valuesOf = (yarn: PresentedYarn): YarnForm => ({ yarn: yarnContent(yarn) });

/** A yarn, for all its colours and lots. */
export function YarnSheet(props: YarnSheetProps) {
  const { yarn, units, terms, currency, onChange, onClose } = props;
  const done = () => {
    onChange();
    onClose();
  };
  const editing = useVersionedForm<YarnForm, PresentedYarn>({
    schema: yarnFormSchema,
    initial: yarn,
    blank: valuesOf(yarn),
    valuesOf,
    prefix: 'yarn',
    save: (values, from) => updateYarn(from ?? yarn, values.yarn),
    onSaved: done,
  });
  const deleting = useMutation({ mutationFn: () => deleteYarn(yarn.id), onSuccess: done });
  const { conflict } = editing;
  return (
    <EditSheet
      title={yarn.name}
      description="Grams and metres of the skein hold for every lot of this yarn."
      what="yarn"
      editing={editing}
      differences={
        conflict &&
        differencesOf(conflict.yours.yarn, yarnContent(conflict.theirs), yarnWording(units))
      }
      more={
        <Button
          kind="quiet"
          icon={Trash2}
          className="text-madder"
          busy={deleting.isPending && 'Deleting…'}
          onClick={() => deleting.mutate()}
        >
          Delete yarn
        </Button>
      }
      onClose={onClose}
    >
      {deleting.error && (
        <Notice kind="problem" live>
          {failureWords(deleting.error)}
        </Notice>
      )}
      <YarnFields {...{ units, terms, currency }} />
    </EditSheet>
  );
}
