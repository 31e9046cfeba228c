/** The four roles of a lab. One person may hold several. */
export const roles = ['engineer', 'analyst', 'manager', 'administrator'] as const;

export type Role = (typeof roles)[number];

/** The words a screen shows for a role. */
export const roleTitles: Record<Role, string> = {
  engineer: 'Test engineer',
  analyst: 'Analyst',
  manager: 'Manager',
  administrator: 'Administrator',
};
