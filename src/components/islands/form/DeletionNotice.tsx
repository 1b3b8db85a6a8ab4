import { Notice } from '../../ui/Notice';
import { Toast } from '../../ui/Toast';
import type { Deletion } from './useDeletion';

interface DeletionNoticeProps<Row> {
  deletion: Deletion<Row>;
  /** "Sc in Lindry Aran" or "3 swatches" */
  what: (rows: readonly Row[]) => string;
}

/** Says what was deleted and offers it back, or says why it was not. */
export function DeletionNotice<Row>({ deletion, what }: DeletionNoticeProps<Row>) {
  const { deleted, failure, forget, undo } = deletion;
  return (
    <>
      {failure && (
        <Notice kind="problem" live className="mb-4">
          {failure}
        </Notice>
      )}
      <Toast
        open={deleted.length > 0}
        onOpenChange={(open) => !open && forget()}
        action={{ word: 'Undo', onSelect: undo }}
      >
        {deleted.length > 0 && `${what(deleted)} deleted.`}
      </Toast>
    </>
  );
}
