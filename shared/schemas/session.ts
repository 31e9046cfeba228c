import { z } from 'zod';
import { roles } from '../access/roles.ts';
import { idSchema } from './common.ts';

export const signInSchema = z
  .strictObject({
    email: z.string().trim().min(3).max(254),
    password: z.string().min(1).max(1000),
  })
  .meta({ id: 'SignIn' });

export const sessionUserSchema = z.object({
  id: idSchema,
  name: z.string(),
  email: z.string(),
  roles: z.array(z.enum(roles)),
});

/** `user` is null when nobody is signed in; `csrfToken` goes into `X-CSRF-Token`. */
export const sessionSchema = z
  .object({ user: sessionUserSchema.nullable(), csrfToken: z.string() })
  .meta({ id: 'Session' });

export type SignIn = z.infer<typeof signInSchema>;
export type SessionUser = z.infer<typeof sessionUserSchema>;
export type Session = z.infer<typeof sessionSchema>;
