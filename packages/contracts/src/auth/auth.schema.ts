import { z } from 'zod';
import { email } from '../common/primitives.schema.js';

/** POST /api/auth/sign-in */
export const signInBody = z.strictObject({
  email,
  password: z.string().min(1, 'Enter your password').max(128),
});
export type SignInBody = z.infer<typeof signInBody>;

export const memberRole = z.enum(['owner', 'staff', 'mechanic']);
export type MemberRole = z.infer<typeof memberRole>;

/** GET /api/auth/me, also the answer to sign-in; account is null for a guest. */
export const meView = z.object({
  account: z
    .object({
      id: z.string(),
      email: z.string(),
      displayName: z.string(),
      platformRole: z.enum(['rider', 'curator', 'administrator']),
      organisations: z.array(
        z.object({
          id: z.string(),
          name: z.string(),
          isShop: z.boolean(),
          isWorkshop: z.boolean(),
          role: memberRole,
        }),
      ),
    })
    .nullable(),
});
export type MeView = z.infer<typeof meView>;

/** POST /api/auth/password-reset → 202 always */
export const resetRequestBody = z.strictObject({ email });
export type ResetRequestBody = z.infer<typeof resetRequestBody>;

export const newPassword = z
  .string()
  .min(15, 'Use 15 characters or more; a few words you can remember do well')
  .max(128, 'Use 128 characters or fewer');
/** POST /api/auth/password-reset/confirm → 204 */
export const resetConfirmBody = z.strictObject({ token: z.string().min(20).max(100), password: newPassword });
export type ResetConfirmBody = z.infer<typeof resetConfirmBody>;
