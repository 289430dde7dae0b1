export const ROLES = ['technician', 'trainee', 'lead'] as const;
export type Role = (typeof ROLES)[number];

/** What each role may do; the one table that the API's guard and the web's menus read. */
export const PERMISSIONS = {
  'account.use': ['technician', 'trainee', 'lead'],
  'trailers.read': ['technician', 'trainee', 'lead'],
  'trailers.write': ['technician', 'lead'],
  'plans.read': ['technician', 'trainee', 'lead'],
  'plans.publish': ['lead'],
  'traces.run': ['technician', 'lead'],
  'traces.readAll': ['technician', 'lead'],
  'traces.readOwn': ['technician', 'trainee', 'lead'],
  'people.read': ['lead'],
  'people.write': ['lead'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

/** Whether a role holds a permission. */
export function may(role: Role, permission: Permission): boolean {
  return (PERMISSIONS[permission] as readonly Role[]).includes(role);
}
