import { z } from 'zod';

/** Everyone is a member and may sell and buy; these are granted on top. */
export const roles = { surveyor: 'Surveyor', office: 'Office' } as const;
export type Role = keyof typeof roles;
export const role = z.enum(Object.keys(roles) as [Role, ...Role[]], 'Choose a role');
