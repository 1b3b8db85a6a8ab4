import { Eye, EyeOff } from 'lucide-react';
import { useState, type ComponentProps } from 'react';
import { Button } from '../../ui/Button';
import { Field } from '../../ui/Field';

/** A password, which can be shown: typing blind is what makes people choose short ones. */
export function PasswordField({ className, ...field }: ComponentProps<typeof Field>) {
  const [isShown, setShown] = useState(false);
  return (
    <div className={className}>
      <Field
        {...field}
        type={isShown ? 'text' : 'password'}
        spellCheck={false}
        autoCapitalize="off"
      />
      <Button
        kind="quiet"
        small
        icon={isShown ? EyeOff : Eye}
        aria-pressed={isShown}
        aria-controls={field.id}
        onClick={() => setShown(!isShown)}
        className="-ms-2 mt-1"
      >
        Show the password
      </Button>
    </div>
  );
}
