import * as z from './zod';
import { workingRoleSchema, WORKING_ROLES } from './roles';
import {
  EMAIL_MAX_LENGTH,
  NAME_MAX_LENGTH,
  PASSWORD_MAX_LENGTH,
  PASSWORD_MIN_LENGTH,
} from './user';

const MIN_DIFFERENT_CHARACTERS = 4;

/** Trimmed and in lower case, so that one address is one account however it is typed. */
export const emailSchema = z
  .string({ error: 'Enter your e-mail address.' })
  .trim()
  .toLowerCase()
  .min(1, { error: 'Enter your e-mail address.', abort: true })
  .max(EMAIL_MAX_LENGTH, `An e-mail address has at most ${EMAIL_MAX_LENGTH} characters.`)
  .pipe(z.email('Enter an address like name@example.com.'));

export const personNameSchema = z
  .string({ error: 'Enter your name.' })
  .trim()
  .normalize()
  .min(1, 'Enter your name.')
  .max(NAME_MAX_LENGTH, `Use at most ${NAME_MAX_LENGTH} characters.`)
  .regex(/^\P{Cc}*$/u, 'Leave out line breaks and control characters.');

/** A password being chosen. */
export const newPasswordSchema = z
  .string({ error: 'Choose a password.' })
  .min(1, 'Choose a password.')
  .refine((text) => text === '' || text.length >= PASSWORD_MIN_LENGTH, {
    error: ({ input }) =>
      `Use at least ${PASSWORD_MIN_LENGTH} characters; this has ${String(input).length}.`,
  })
  .max(PASSWORD_MAX_LENGTH, `Use at most ${PASSWORD_MAX_LENGTH} characters.`)
  .refine(
    (text) => text.length < PASSWORD_MIN_LENGTH || new Set(text).size >= MIN_DIFFERENT_CHARACTERS,
    `Use at least ${MIN_DIFFERENT_CHARACTERS} different characters.`,
  );

/** A password being given: any text, since rules may have changed after it was chosen. */
export const givenPasswordSchema = z
  .string({ error: 'Enter your password.' })
  .min(1, 'Enter your password.')
  .max(1024, 'That is too long to be a password here.');

export const workingRolesSchema = z
  .array(workingRoleSchema, { error: 'Choose from the listed roles.' })
  .min(1, 'Choose at least one.')
  .max(WORKING_ROLES.length, 'Choose each role once.')
  .refine((roles) => new Set(roles).size === roles.length, 'Choose each role once.');

export const signInSchema = z.object({ email: emailSchema, password: givenPasswordSchema });

export const CONTAINS_EMAIL = 'Choose a password that does not contain your e-mail address.';

export const registerSchema = z
  .object({
    name: personNameSchema,
    email: emailSchema,
    password: newPasswordSchema,
    roles: workingRolesSchema,
  })
  .refine(({ email, password }) => !password.toLowerCase().includes(email), {
    path: ['password'],
    error: CONTAINS_EMAIL,
  });

export const emailOnlySchema = z.object({ email: emailSchema });
/** Says no more than that it was asked: what is found stays untold. */
export const acceptedSchema = z.object({ isAccepted: z.boolean() });
/** Whether the letter left: if not, the person asks for another. */
export const letterSchema = z.object({ isMailSent: z.boolean() });

export const linkTokenSchema = z
  .string({ error: 'The link is not complete.' })
  .regex(/^[\w-]{43}$/, 'The link is not complete. Copy all of it from the letter.');
export const confirmSchema = z.object({ token: linkTokenSchema });
/** The address whose link was followed, to fill in at sign-in. */
export const ownerSchema = z.object({ email: z.string() });
export const resetPasswordSchema = z.object({
  token: linkTokenSchema,
  password: newPasswordSchema,
});

export const profileSchema = z.object({
  name: personNameSchema,
  roles: workingRolesSchema,
  version: z.int({ error: 'The version is missing.' }).positive(),
});
export const changeEmailSchema = z.object({ email: emailSchema, password: givenPasswordSchema });
export const changePasswordSchema = z.object({
  currentPassword: givenPasswordSchema,
  password: newPasswordSchema,
});
export const deleteAccountSchema = z.object({ password: givenPasswordSchema });

export type SignInForm = z.input<typeof signInSchema>;
export type RegisterForm = z.input<typeof registerSchema>;
export type Registration = z.output<typeof registerSchema>;
export type ProfileForm = z.input<typeof profileSchema>;
export type Profile = z.output<typeof profileSchema>;
export type Letter = z.output<typeof letterSchema>;

/** How Auth.js answers a sign-in that asked not to be redirected. */
export const signInAnswerSchema = z.object({ url: z.url() });
/** Why a sign-in was refused; `failed` is anything but the person's own doing. */
export type SignInRefusal = 'wrong' | 'unconfirmed' | 'too-many' | 'failed';
