/**
 * Who may do what with a boat and what belongs to her. Roles are per boat. Everything that is not named
 * here is refused. A shore contact holds a link to one page and no membership, so the column is empty.
 */
export const boatRoles = ['owner', 'skipper', 'crew'] as const;
export type BoatRole = (typeof boatRoles)[number];
export type Role = BoatRole | 'shore';

export const permissions = {
  //                  owner, skipper, crew, shore contact
  'read-boat': ['owner', 'skipper', 'crew'],
  'write-boat-sheet': ['owner'],
  'rename-boat': ['owner'],
  'hide-boat': ['owner'],
  'read-passage': ['owner', 'skipper', 'crew'],
  'write-passage': ['owner', 'skipper'],
  'hide-passage': ['owner', 'skipper'],
} as const satisfies Record<string, readonly Role[]>;

export type Action = keyof typeof permissions;
