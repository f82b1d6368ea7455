/** Roles as the interface names them, by the server's name. */
export const roleWords: Partial<Record<string, string>> = {
  administrator: 'administrator',
  librarian: 'librarian',
  'component-engineer': 'component engineer',
  designer: 'designer',
  purchasing: 'purchasing',
};
