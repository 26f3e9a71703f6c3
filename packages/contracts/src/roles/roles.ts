/** The roles of people who sign in. Residents have no role: they act through the links they were sent. */
export const roles = ['administrator', 'analyst', 'officer'] as const;

/** One of the three roles of people who sign in. */
export type Role = (typeof roles)[number];

/** Whether a text is a role. */
export function isRole(text: string): text is Role {
  return (roles as readonly string[]).includes(text);
}
