import { useEffect, useState, type ComponentProps, type ReactNode } from 'react';
import { Button, type ButtonKind } from '../../ui/Button';
import { Notice } from '../../ui/Notice';

interface AccountFormProps extends Omit<ComponentProps<'form'>, 'children'> {
  children: ReactNode;
  /** On the button: "Register", and while it is being done: "Registering…". */
  submitWord: string;
  busyWord: string;
  isBusy: boolean;
  kind?: ButtonKind;
  /** What failed and belongs to no field. */
  failure: string | null;
  /** Beside the button. */
  beside?: ReactNode;
}

/** Fields over a button. `post`, so that a press before the script runs puts nothing in the address. */
export function AccountForm(props: AccountFormProps) {
  const {
    children,
    submitWord,
    busyWord,
    isBusy,
    kind = 'primary',
    failure,
    beside,
    ...form
  } = props;
  const [isReady, setReady] = useState(false);
  useEffect(() => setReady(true), []);
  return (
    <form
      method="post"
      noValidate
      data-ready={isReady || undefined}
      className="space-y-5"
      {...form}
    >
      {children}
      {failure && (
        <Notice kind="problem" live>
          {failure}
        </Notice>
      )}
      <div className="flex flex-wrap items-center gap-x-5 gap-y-3">
        <Button type="submit" kind={kind} busy={isBusy && busyWord}>
          {submitWord}
        </Button>
        {beside}
      </div>
    </form>
  );
}
