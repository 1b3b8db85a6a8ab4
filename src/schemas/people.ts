import * as z from './zod';
import { currentUserSchema } from './user';
import { roleSchema, ROLES } from './roles';

export const PEOPLE_PER_PAGE = 50;
export const AUDIT_ENTRIES_PER_PAGE = 50;
const PAGE_MAX = 10_000;
const SEARCH_MAX_LENGTH = 100;

export const PEOPLE_SORTS = ['name', 'email', 'registered'] as const;

/** Page numbers start at 1, and come from an address as text. */
export const pageSchema = z
  .string()
  .regex(/^[1-9]\d{0,4}$/, `A page is a whole number from 1 to ${PAGE_MAX}.`)
  .transform(Number)
  .refine((page) => page <= PAGE_MAX, `A page is a whole number from 1 to ${PAGE_MAX}.`)
  .default(1);

export const peopleQuerySchema = z.object({
  search: z
    .string()
    .trim()
    .max(SEARCH_MAX_LENGTH, `Search for at most ${SEARCH_MAX_LENGTH} characters.`)
    .default(''),
  sort: z.enum(PEOPLE_SORTS, { error: 'Sort by name, email or registered.' }).default('name'),
  direction: z.enum(['up', 'down'], { error: 'A direction is up or down.' }).default('up'),
  page: pageSchema,
});
export type PeopleQuery = z.output<typeof peopleQuerySchema>;

export const personSchema = currentUserSchema.extend({
  isConfirmed: z.boolean(),
  registeredAt: z.iso.datetime(),
  version: z.int(),
});
export type Person = z.output<typeof personSchema>;

export const peopleSchema = z.object({
  people: z.array(personSchema),
  totalCount: z.int(),
  page: z.int(),
  pageCount: z.int(),
});
export type People = z.output<typeof peopleSchema>;

export const personParamsSchema = z.object({ id: z.uuid('That is not the id of a person.') });

export const rolesChangeSchema = z.object({
  roles: z
    .array(roleSchema, { error: 'Choose from the listed roles.' })
    .min(1, 'Choose at least one.')
    .max(ROLES.length, 'Choose each role once.')
    .refine((roles) => new Set(roles).size === roles.length, 'Choose each role once.'),
  version: z.int({ error: 'The version is missing.' }).positive(),
});
export type RolesChange = z.output<typeof rolesChangeSchema>;

export const auditQuerySchema = z.object({ page: pageSchema });

export const auditEntrySchema = z.object({
  id: z.uuid(),
  action: z.enum(['roles-set', 'first-administrator']),
  actorName: z.string(),
  subjectName: z.string(),
  before: z.array(roleSchema),
  after: z.array(roleSchema),
  at: z.iso.datetime(),
});
export type PresentedAuditEntry = z.output<typeof auditEntrySchema>;

export const auditSchema = z.object({
  entries: z.array(auditEntrySchema),
  totalCount: z.int(),
  page: z.int(),
  pageCount: z.int(),
});
export type Audit = z.output<typeof auditSchema>;
