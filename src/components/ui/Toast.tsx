import { X } from 'lucide-react';
import { Toast as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { Button } from './Button';

interface ToastProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  children: ReactNode;
  /** One act, usually "Undo". */
  action?: { word: string; onSelect: () => void };
}

/** Says that something was done elsewhere on the page, and offers to take it back. */
export function Toast({ open, onOpenChange, children, action }: ToastProps) {
  return (
    <Radix.Provider duration={8000} swipeDirection="down">
      <Radix.Root
        open={open}
        onOpenChange={onOpenChange}
        className="flex items-center gap-2 rounded-control bg-ink py-1.5 ps-4 pe-1.5 text-surface shadow-float"
      >
        <Radix.Description className="flex-1">{children}</Radix.Description>
        {action && (
          <Radix.Action altText={action.word} asChild onClick={action.onSelect}>
            <Button small>{action.word}</Button>
          </Radix.Action>
        )}
        <Radix.Close asChild>
          <Button small icon={X}>
            Close
          </Button>
        </Radix.Close>
      </Radix.Root>
      <Radix.Viewport
        data-chrome
        className="fixed inset-x-4 bottom-[calc(1rem+max(var(--answer-bar),env(safe-area-inset-bottom,0px)))] z-50 mx-auto max-w-md outline-none"
      />
    </Radix.Provider>
  );
}
