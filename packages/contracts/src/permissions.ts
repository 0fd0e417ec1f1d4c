import type { Role } from './roles.js';

/** Everything that may be allowed or refused. The API enforces this table and the interface reads it: there is no other. */
export const permissions = {
  'lab.read': ['engineer', 'analyst', 'qa', 'admin'],
  'intake.edit': ['engineer'],
  'session.edit': ['engineer'],
  'file.upload': ['engineer'],
  'file.edit': ['engineer'],
  'trace.edit': ['engineer'],
  'level.type': ['engineer'],
  'requirement.edit': ['engineer', 'analyst'],
  'people.manage': ['admin'],
  'audit.read': ['qa', 'admin'],
  'token.own': ['engineer', 'analyst', 'qa', 'admin', 'client'],
  'own-sample.read': ['client'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof permissions;

/**
 * Whether any of the held roles grants a permission.
 * @param held roles of the signed-in person.
 * @param permission what is to be done.
 * @example isAllowed(['qa'], 'file.upload') // false
 */
export function isAllowed(held: readonly Role[], permission: Permission): boolean {
  const granted: readonly Role[] = permissions[permission];
  return held.some((role) => granted.includes(role));
}
