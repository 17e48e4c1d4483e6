/** What a person may be in the studio; one person may hold several. */
export const roles = ['owner', 'caster', 'apprentice', 'jeweller'] as const;

/** One of the studio's roles. */
export type Role = (typeof roles)[number];

/** The roles that may stand at the furnace and run a pour card. */
export const furnaceRoles: readonly Role[] = ['owner', 'caster', 'apprentice'];
