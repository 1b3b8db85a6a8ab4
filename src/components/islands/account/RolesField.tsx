import { CircleAlert } from 'lucide-react';
import type { UseFormRegisterReturn } from 'react-hook-form';
import { ROLE_HINTS, type Role } from '../../../schemas/roles';
import { capitalised } from '../../ui/inWords';
import { Checkbox } from '../../ui/Checkbox';

interface RolesFieldProps {
  legend: string;
  roles: readonly Role[];
  registration: UseFormRegisterReturn;
  error?: string;
}

/** Roles to choose, several at once, each with what it is for. */
export function RolesField({ legend, roles, registration, error }: RolesFieldProps) {
  return (
    <fieldset aria-describedby={error ? 'roles-error' : undefined}>
      <legend className="label mb-1">{legend}</legend>
      <div className="space-y-2">
        {roles.map((role) => (
          <Checkbox
            key={role}
            {...registration}
            id={`role-${role}`}
            value={role}
            label={capitalised(role)}
            hint={ROLE_HINTS[role]}
            aria-invalid={error ? true : undefined}
          />
        ))}
      </div>
      {error && (
        <p id="roles-error" className="mt-1 flex gap-1.5 text-sm text-madder">
          <CircleAlert size={15} aria-hidden className="mt-px shrink-0" />
          {error}
        </p>
      )}
    </fieldset>
  );
}
