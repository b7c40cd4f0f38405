import { z } from 'zod';

export const ROLES = ['designer', 'librarian', 'test-engineer', 'reviewer', 'admin'] as const;
export type Role = (typeof ROLES)[number];

export const signInSchema = z.strictObject({
  email: z.email().max(254),
  /** Longer than 72 bytes is hashed first on the server, so that no tail is ignored. */
  password: z.string().min(1).max(256),
});
export type SignIn = z.output<typeof signInSchema>;

export const sessionSchema = z.object({
  user: z.object({ id: z.uuid(), name: z.string(), initials: z.string(), email: z.string(), roles: z.array(z.enum(ROLES)) }),
  team: z.object({ id: z.uuid(), name: z.string() }),
});
export type Session = z.output<typeof sessionSchema>;

export const createTokenSchema = z.strictObject({ name: z.string().trim().min(1).max(80), days: z.number().int().min(1).max(365).default(90) });
export const tokenSchema = z.object({ id: z.uuid(), name: z.string(), createdAt: z.iso.datetime(), expiresAt: z.iso.datetime(), lastUsedAt: z.iso.datetime().nullable() });
/** The secret is shown once, when the token is made. */
export const createdTokenSchema = tokenSchema.extend({ secret: z.string() });
export const tokenListSchema = z.object({ tokens: z.array(tokenSchema) });
