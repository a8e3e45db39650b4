import { z } from 'zod';

export const roles = ['admin', 'engineer', 'checker', 'drafter'] as const;
export type Role = (typeof roles)[number];

/** POST /api/session */
export const signInSchema = z.object({
  email: z.string().trim().toLowerCase().max(254),
  password: z.string().min(1).max(200),
});
export type SignIn = z.infer<typeof signInSchema>;

/** answer of POST and GET /api/session */
export interface Session {
  readonly person: { readonly id: string; readonly name: string; readonly email: string; readonly role: Role };
  readonly office: { readonly id: string; readonly name: string };
}
