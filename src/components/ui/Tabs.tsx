import { Tabs as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { classNames } from './classNames';

interface Tab<Key extends string> {
  key: Key;
  word: string;
  content: ReactNode;
}

interface TabsProps<Key extends string> {
  label: string;
  tabs: readonly Tab<Key>[];
  value: Key;
  onChange: (key: Key) => void;
  className?: string;
}

/** Several views of one thing. On paper all of them are printed, each under its word. */
export function Tabs<Key extends string>({
  label,
  tabs,
  value,
  onChange,
  className,
}: TabsProps<Key>) {
  return (
    <Radix.Root
      value={value}
      onValueChange={(key) => onChange(key as Key)}
      className={className}
      activationMode="automatic"
    >
      <Radix.List
        aria-label={label}
        className="flex [scrollbar-width:none] gap-5 overflow-x-auto border-b border-line"
      >
        {tabs.map(({ key, word }) => (
          <Radix.Trigger
            key={key}
            value={key}
            className={classNames(
              'min-h-10 shrink-0 text-ink-2 hover:text-ink coarse:min-h-11',
              'data-[state=active]:border-b-3 data-[state=active]:border-teal data-[state=active]:pt-[3px] data-[state=active]:font-bold data-[state=active]:text-ink',
              'focus-visible:-outline-offset-2',
            )}
          >
            {word}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {tabs.map(({ key, word, content }) => (
        <Radix.Content
          key={key}
          value={key}
          forceMount
          className="pt-4 data-[state=inactive]:hidden print:data-[state=inactive]:block"
        >
          <h3 className="hidden print:block">{word}</h3>
          {content}
        </Radix.Content>
      ))}
    </Radix.Root>
  );
}
