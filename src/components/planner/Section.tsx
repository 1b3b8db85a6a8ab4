import type { ReactNode } from 'react';

/** One group of inputs, parted from the one above by a line. */
export function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <fieldset className="border-t border-line pt-4">
      <legend className="float-start w-full font-bold">{title}</legend>
      <div className="clear-both grid grid-cols-6 gap-x-2.5 gap-y-3 pt-2.5">{children}</div>
    </fieldset>
  );
}
