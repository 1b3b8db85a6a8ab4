import * as z from './zod';
import { LIST_LIMITS, PLAN_LIMITS } from './limits';

const inWords = new Intl.NumberFormat('en', { maximumFractionDigits: 6 });

/** Characters that no name holds and that PostgreSQL or a spreadsheet would trip over. */
const CONTROL = /[\p{Cc}\p{Cs}]/u;
const CONTROL_EXCEPT_LINES = /(?![\n\t])[\p{Cc}\p{Cs}]/u;

const missingOr = (missing: string, wrong: string) => (issue: { input?: unknown }) =>
  issue.input === undefined || issue.input === null ? missing : wrong;

/** An object that refuses fields it does not know, so that nothing is assigned by accident. */
export function strict<Shape extends z.ZodRawShape>(what: string, shape: Shape) {
  return z.strictObject(shape, {
    error: (issue) =>
      issue.code === 'unrecognized_keys'
        ? `${what} has no field named ${issue.keys.join(', ')}`
        : missingOr(`${what} is missing`, `${what} must be an object`)(issue),
  });
}

/** A list of `least` to `most` items. */
export function list<Item extends z.ZodType>(
  what: string,
  item: Item,
  least: number,
  most: number,
) {
  return z
    .array(item, { error: missingOr(`${what} are missing`, `${what} must be a list`) })
    .min(least, `${what} must be at least ${least}`)
    .max(most, `${what} must be at most ${inWords.format(most)}`);
}

/** A line of text that must not be empty. */
export function name(what: string, longest: number = PLAN_LIMITS.nameLength) {
  return line(what, longest).min(1, `${what} is missing`);
}

/** A line of text that may be empty. */
export function line(what: string, longest: number) {
  return z
    .string({ error: missingOr(`${what} is missing`, `${what} must be text`) })
    .trim()
    .max(longest, `${what} must have at most ${longest} characters`)
    .refine((text) => !CONTROL.test(text), `${what} must not contain control characters`);
}

/** Several lines of text, which may be empty. */
export function notes(what: string, longest: number) {
  return z
    .string({ error: missingOr(`${what} are missing`, `${what} must be text`) })
    .trim()
    .max(longest, `${what} must have at most ${inWords.format(longest)} characters`)
    .refine(
      (text) => !CONTROL_EXCEPT_LINES.test(text),
      `${what} must not contain control characters`,
    );
}

function number(what: string) {
  return z.number({ error: missingOr(`${what} is missing`, `${what} must be a number`) });
}

const atMost = (what: string, most: number, unit: string) =>
  `${what} must be at most ${inWords.format(most)}${unit && ` ${unit}`}`;

/** A measurement: more than 0, at least `least` and at most `most`. */
export function measured(what: string, unit: string, most: number, least = 0) {
  return number(what)
    .gt(0, `${what} must be more than 0 ${unit}`)
    .min(least, `${what} must be at least ${inWords.format(least)} ${unit}`)
    .max(most, atMost(what, most, unit));
}

/** A measurement that may be 0. */
export function measuredOrZero(what: string, unit: string, most: number) {
  return number(what)
    .min(0, `${what} must not be less than 0 ${unit}`)
    .max(most, atMost(what, most, unit));
}

/** A whole number from `least` to `most`. */
export function counted(what: string, least: number, most: number) {
  return number(what)
    .int(`${what} must be a whole number`)
    .min(
      least,
      least === 0 ? `${what} must not be less than 0` : `${what} must be at least ${least}`,
    )
    .max(most, atMost(what, most, ''));
}

/** Yes or no. */
export function flag(what: string) {
  return z.boolean({ error: `${what} must be yes or no` });
}

/** One of a few known values. */
export function choice<const Values extends readonly (string | number)[]>(
  what: string,
  values: Values,
) {
  return z.literal(values, { error: `${what} must be one of ${values.join(', ')}` });
}

/** A colour as drawn, "#rrggbb"; capitals become small letters. */
export const hex = z
  .string({ error: 'Colour must be text such as #2f6f6b' })
  .regex(
    /^#[0-9a-fA-F]{6}$/,
    'Colour must be written as # and six digits 0-9, a-f, such as #2f6f6b',
  )
  .toLowerCase();

export const uuid = z.uuid({ error: 'This is not the id of anything kept here' });
export const idParams = z.strictObject({ id: uuid });
export const keyParams = z.strictObject({ id: name('Key', PLAN_LIMITS.keyLength) });

/** Number of the save that an edit began from; an edit that began from an older one is refused. */
export const version = counted('Version', 1, 2_147_483_647);

/** `/[id]/…/[version]`: one save of a row. */
export const saveParams = z.strictObject({
  id: uuid,
  version: z
    .string()
    .regex(/^[1-9]\d{0,8}$/, 'Version must be a whole number')
    .transform(Number),
});
/** Restoring an older save begins from the version the person sees now. */
export const restoreInput = strict('Restore', { version });

/** A calendar day, "2026-11-30". */
export const day = z.iso.date({ error: 'Date must be a day such as 2026-11-30' });

/** A moment in a response, ISO 8601 in UTC. */
export const moment = z.iso.datetime();

/** A table as RFC 4180, for a spreadsheet. */
export const csvText = z.string();

const pageNumber = (what: string, least: number, most: number, usual: number) =>
  z
    .string()
    .regex(/^\d{1,9}$/, `${what} must be a whole number`)
    .transform(Number)
    .pipe(counted(what, least, most))
    .default(usual);

/** `?limit=…&offset=…` of every list. */
export const listQuery = z.strictObject({
  limit: pageNumber('limit', 1, LIST_LIMITS.most, LIST_LIMITS.usual),
  offset: pageNumber('offset', 0, LIST_LIMITS.offset, 0),
});
export type ListQuery = z.output<typeof listQuery>;

/** What every list answers: one page of items and how many there are in all. */
export function listOf<Item extends z.ZodType>(item: Item) {
  return z.strictObject({ items: z.array(item), total: z.number().int() });
}
