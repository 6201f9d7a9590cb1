import { ROLE_NAMES, ROLES } from '@/shared/roles/roles';

/** Roles as choices, by their names. */
export const ROLE_CHOICES = ROLES.map((role) => ({ value: role, label: ROLE_NAMES[role] }));
