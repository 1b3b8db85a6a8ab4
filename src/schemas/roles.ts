import * as z from './zod';

/** The roles a person may say they work as. */
export const WORKING_ROLES = ['maker', 'designer', 'seller', 'teacher', 'student'] as const;

/** All roles: `administrator` is given by another administrator, never chosen. */
export const ROLES = [...WORKING_ROLES, 'administrator'] as const;

export const workingRoleSchema = z.enum(WORKING_ROLES);
export const roleSchema = z.enum(ROLES);

export type WorkingRole = z.output<typeof workingRoleSchema>;
export type Role = z.output<typeof roleSchema>;

/** What each role does here, as shown beside its box. */
export const ROLE_HINTS: Readonly<Record<Role, string>> = {
  maker: 'plan blankets and buy the yarn for them',
  designer: 'write motifs and publish what they need',
  seller: 'make kits, quotes and stock from them',
  teacher: 'lead a class and compare its joins',
  student: 'take part in a class',
  administrator: 'look after accounts',
};
