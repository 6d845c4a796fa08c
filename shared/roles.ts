/** People of the contractor who may sign in to the desk. */
export const roles = ['owner', 'estimator', 'sales'] as const;
export type Role = (typeof roles)[number];

export const roleWords: Record<Role, string> = { owner: 'Owner', estimator: 'Estimator', sales: 'Sales lead' };

/** Pages of the desk and who may open them; the server's policies decide, this only draws the rail. */
export const deskPages = [
  { id: 'leads', title: 'Leads', href: '/desk/leads', roles: ['owner', 'estimator', 'sales'] },
] as const satisfies readonly { id: string; title: string; href: string; roles: readonly Role[] }[];
