import { X } from 'lucide-react';
import { Dialog as Radix } from 'radix-ui';
import { useRef, type ReactNode } from 'react';
import { classNames } from './classNames';
import { Button } from './Button';

interface DialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  /** One sentence under the title; read out when the dialog opens. */
  description?: ReactNode;
  children?: ReactNode;
  /** Buttons at the foot, the main one first. */
  actions?: ReactNode;
}

const centred =
  'max-h-[85dvh] w-[min(32rem,calc(100vw-2rem))] top-1/2 left-1/2 -translate-x-1/2 -translate-y-1/2 rounded-control border';
const sideways = 'inset-y-0 right-0 w-full sm:border-s pb-[env(safe-area-inset-bottom)]';
const sheetWidth = { usual: 'sm:w-[min(34rem,90vw)]', wide: 'sm:w-[min(72rem,94vw)]' } as const;

/** A question in the middle of the page. */
export function Dialog(props: DialogProps) {
  return <Panel {...props} place={centred} />;
}

/** A long thing beside the page: full height, and the whole screen on a phone. */
export function Sheet({ wide, ...props }: DialogProps & { wide?: boolean }) {
  return <Panel {...props} place={classNames(sideways, sheetWidth[wide ? 'wide' : 'usual'])} />;
}

function Panel(props: DialogProps & { place: string }) {
  const { open, onOpenChange, title, description, children, actions, place } = props;
  // Opened by state rather than by a trigger of its own, it has to remember where the focus was.
  const opener = useRef<Element | null>(null);
  function giveBackFocus(event: Event) {
    event.preventDefault();
    if (opener.current instanceof HTMLElement) opener.current.focus();
  }
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-50 bg-veil" />
        <Radix.Content
          className={classNames(
            'fixed z-50 flex flex-col border-edge bg-surface shadow-float outline-none',
            place,
          )}
          onOpenAutoFocus={() => (opener.current = document.activeElement)}
          onCloseAutoFocus={giveBackFocus}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <div className="flex items-start justify-between gap-4 px-5 pt-4 pb-2">
            <div>
              <Radix.Title className="text-xl font-bold">{title}</Radix.Title>
              {description && (
                <Radix.Description className="mt-1 text-ink-2">{description}</Radix.Description>
              )}
            </div>
            <Radix.Close asChild>
              <Button kind="quiet" icon={X} className="-me-2 -mt-1.5 shrink-0">
                Close
              </Button>
            </Radix.Close>
          </div>
          <div className="min-h-0 flex-1 overflow-y-auto px-5 py-2">{children}</div>
          {actions && <div className="flex flex-wrap gap-3 px-5 pt-2 pb-5">{actions}</div>}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
