import * as z from './zod';
import { preferencesSchema } from './preferences';
import { roleSchema } from './roles';

export const NAME_MAX_LENGTH = 80;
/** RFC 5321: a path holds 256 octets with its angle brackets. */
export const EMAIL_MAX_LENGTH = 254;
/** Long enough to be slow to guess; NIST SP 800-63B asks for at least 8 and no composition rules. */
export const PASSWORD_MIN_LENGTH = 10;
export const PASSWORD_MAX_LENGTH = 128;

/** Who is calling, as pages, islands and routes know them. */
export const currentUserSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  roles: z.array(roleSchema),
});
export type CurrentUser = z.output<typeof currentUserSchema>;

/** One's own account: everything the settings page shows. */
export const accountSchema = currentUserSchema.extend({
  preferences: preferencesSchema,
  /** An address asked for and not yet confirmed. */
  pendingEmail: z.string().nullable(),
  version: z.int(),
});
export type Account = z.output<typeof accountSchema>;
