export const ROLES = ['administrator', 'librarian', 'component-engineer', 'designer', 'purchasing'] as const;

/** What a person is here to do; one person may hold several. */
export type Role = (typeof ROLES)[number];
