import { Copy, Pencil, Plus, Trash2 } from 'lucide-react';
import { useState } from 'react';
import { Button } from '../ui/Button';
import { Dialog, Sheet } from '../ui/Dialog';
import { EmptyState } from '../ui/EmptyState';
import { ErrorSummary } from '../ui/ErrorSummary';
import { Menu } from '../ui/Menu';
import { Notice } from '../ui/Notice';
import { SaveStatus } from '../ui/SaveStatus';
import { Skeleton } from '../ui/Skeleton';
import { Toast } from '../ui/Toast';
import { WoundCard } from '../ui/WoundCard';
import { Section } from './Section';

export function Messages() {
  const [open, setOpen] = useState<'dialog' | 'sheet' | 'toast' | null>(null);
  const close = () => setOpen(null);
  return (
    <div className="space-y-12">
      <Section title="Notices">
        <div className="grid gap-4 lg:grid-cols-3">
          <Notice title="Narrow it further">
            Weigh <b>8 motifs together</b> instead of 4: the margin falls from ±4.5 % to ±3.4 %, and
            Harbour needs 6 skeins, not 7.
          </Notice>
          <Notice kind="question" action={<Button small>The height is right</Button>}>
            18 rows in 12.4 cm is outside what medium yarn could give.
          </Notice>
          <Notice kind="problem" title="Short of yarn">
            Rowan, lot K377: 214 m needed, 180 m in hand.
          </Notice>
        </div>
        <div className="mt-4 max-w-xl">
          <ErrorSummary
            attempt={0}
            errors={[
              { field: 'width', message: 'Write the width of the swatch' },
              { field: 'grams', message: 'The swatch must weigh more than 0 g' },
            ]}
          />
        </div>
      </Section>

      <Section title="Saving">
        <div className="flex flex-wrap gap-8">
          <SaveStatus state={{ is: 'saved', at: '14:05' }} />
          <SaveStatus state={{ is: 'saving' }} />
          <SaveStatus state={{ is: 'unsaved' }} />
          <SaveStatus state={{ is: 'failed', why: 'no connection. It is tried again in 10 s.' }} />
        </div>
      </Section>

      <Section title="What opens">
        <div className="flex flex-wrap gap-3">
          <Button onClick={() => setOpen('dialog')}>Open a dialog</Button>
          <Button onClick={() => setOpen('sheet')}>Open a sheet</Button>
          <Button onClick={() => setOpen('toast')}>Show a toast</Button>
          <Menu
            word="More"
            items={[
              { word: 'Rename', icon: Pencil },
              { word: 'Make a copy', icon: Copy },
              { word: 'Remove', icon: Trash2, destructive: true, apart: true },
            ]}
          />
        </div>
        <Dialog
          open={open === 'dialog'}
          onOpenChange={close}
          title="Remove this lot?"
          description="Harbour, lot K418: 4 whole skeins and one of 62 g."
          actions={
            <>
              <Button kind="destructive" icon={Trash2} onClick={close}>
                Remove it
              </Button>
              <Button onClick={close}>Keep it</Button>
            </>
          }
        />
        <Sheet open={open === 'sheet'} onOpenChange={close} title="Ledger: Harbour">
          <p>Join side, 142 of them, 4.1 m each.</p>
        </Sheet>
        <Toast
          open={open === 'toast'}
          onOpenChange={close}
          action={{ word: 'Undo', onSelect: close }}
        >
          Damson taken out of the plan.
        </Toast>
      </Section>

      <Section title="Nothing yet, and not yet">
        <div className="grid gap-6 lg:grid-cols-2">
          <EmptyState
            drawing={<WoundCard colour="#a9b468" weight={3} size="lg" />}
            action={
              <Button kind="primary" icon={Plus}>
                Add a yarn
              </Button>
            }
            example={
              <a className="link" href="#example">
                Load an example stash
              </a>
            }
          >
            Yarn you own is kept here by colour and dye lot, and taken off every shopping list.
          </EmptyState>
          <Skeleton label="Loading the stash" />
        </div>
      </Section>
    </div>
  );
}
