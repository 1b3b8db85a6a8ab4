import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';

export interface Difference {
  label: string;
  yours: string;
  theirs: string;
}

interface ConflictDialogProps {
  /** "swatch" */
  what: string;
  differences: readonly Difference[];
  saving: boolean;
  onKeepYours: () => void;
  onTakeTheirs: () => void;
  onClose: () => void;
}

/** A save that came second: what the two versions say, and the choice between them. */
export function ConflictDialog(props: ConflictDialogProps) {
  const { what, differences, saving, onKeepYours, onTakeTheirs, onClose } = props;
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title="Saved from elsewhere in the meantime"
      description={`Another window or device changed this ${what} after you opened it. Nothing is lost yet: choose which to keep.`}
      actions={
        <>
          <Button kind="primary" busy={saving && 'Saving…'} onClick={onKeepYours}>
            Keep yours
          </Button>
          <Button onClick={onTakeTheirs}>Take the other</Button>
        </>
      }
    >
      <DifferenceTable differences={differences} />
    </Dialog>
  );
}

function DifferenceTable({ differences }: { differences: readonly Difference[] }) {
  if (differences.length === 0) return <p>Both say the same.</p>;
  return (
    <table className="w-full">
      <thead>
        <tr className="text-start text-sm text-ink-2">
          <td />
          <th scope="col" className="px-2 py-1 text-start font-normal">
            yours
          </th>
          <th scope="col" className="px-2 py-1 text-start font-normal">
            the other
          </th>
        </tr>
      </thead>
      <tbody>
        {differences.map(({ label, yours, theirs }) => (
          <tr key={label} className="border-t border-line align-top">
            <th scope="row" className="py-1.5 pe-2 text-start font-normal text-ink-2">
              {label}
            </th>
            <td className="px-2 py-1.5 font-bold">{yours || 'nothing'}</td>
            <td className="px-2 py-1.5 font-bold">{theirs || 'nothing'}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
