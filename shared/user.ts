import { z } from 'zod';
import { date, id, requiredText } from './text';

export const ROLES = ['lead', 'helper', 'supervisor', 'safety'] as const;
export type Role = (typeof ROLES)[number];

export const LOCALES = ['en-US', 'es-MX'] as const;
export type Locale = (typeof LOCALES)[number];

/** `feet`: feet and inches first; `metric`: the published metric value first. */
export const UNITS = ['feet', 'metric'] as const;
export type Units = (typeof UNITS)[number];

export const THEMES = ['system', 'light', 'dark', 'sunlight'] as const;
export type ThemeChoice = (typeof THEMES)[number];

/** The signed-in person, as `GET /api/session` shows them to themselves. */
export const sessionUserSchema = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  qualifiedThrough: z.string().nullable(),
  siteIds: z.array(z.string()),
  locale: z.enum(LOCALES),
  units: z.enum(UNITS),
  theme: z.enum(THEMES),
  hasPin: z.boolean(),
});
export type SessionUser = z.infer<typeof sessionUserSchema>;

export const sessionSchema = z.object({ user: sessionUserSchema });

/** A person as others of the same sites see them; safety also sees the rest. */
export const personSchema = z.object({
  id: z.string(),
  name: z.string(),
  role: z.enum(ROLES),
  qualified: z.boolean(),
  qualifiedThrough: z.string().nullable(),
  email: z.string().optional(),
  siteIds: z.array(z.string()).optional(),
  locale: z.enum(LOCALES).optional(),
  units: z.enum(UNITS).optional(),
  hasPin: z.boolean().optional(),
  invitedAt: z.string().nullable().optional(),
  retired: z.boolean().optional(),
  createdAt: z.string().optional(),
});
export type Person = z.infer<typeof personSchema>;

export const signInSchema = z.strictObject({
  email: z.string().max(320),
  password: z.string().max(1000),
});
export const sessionPatchSchema = z.strictObject({
  locale: z.enum(LOCALES).optional(),
  units: z.enum(UNITS).optional(),
  theme: z.enum(THEMES).optional(),
});
/** 12 characters or more; the server also refuses a shipped list of common ones. */
export const newPassword = z.string().min(12).max(200);

/** Six digits that are not one digit repeated nor a run up or down. */
export const newPin = z
  .string()
  .regex(/^\d{6}$/, { error: 'six digits' })
  .refine(
    (pin) => {
      const steps = new Set([...pin].slice(1).map((digit, i) => Number(digit) - Number(pin[i])));
      return !(steps.size === 1 && [...steps].every((step) => Math.abs(step) <= 1));
    },
    { error: 'sequence', params: { code: 'sequence' } },
  );
export const pin = z.string().regex(/^\d{6}$/, { error: 'six digits' });

export const changePasswordSchema = z.strictObject({
  current: z.string().max(1000),
  password: newPassword,
});
export const changePinSchema = z.strictObject({ password: z.string().max(1000), pin: newPin });
export const requestResetSchema = z.strictObject({ email: z.string().max(320) });
export const useResetSchema = z.strictObject({ password: newPassword, pin: newPin.optional() });

export const createUserSchema = z.strictObject({
  id: id.optional(),
  name: requiredText(),
  email: z.email().max(320),
  role: z.enum(ROLES),
  siteIds: z.array(id).max(200),
  qualifiedThrough: date.nullable().optional(),
  locale: z.enum(LOCALES).optional(),
  units: z.enum(UNITS).optional(),
});
export const updateUserSchema = createUserSchema
  .omit({ id: true })
  .partial()
  .extend({ retired: z.boolean().optional() });

/** There is nothing to say: the invitation goes to the address of the register. */
export const inviteAgainSchema = z.strictObject({});

export const ownSessionSchema = z.object({
  id: z.string(),
  current: z.boolean(),
  createdAt: z.string(),
  lastSeenAt: z.string(),
  userAgent: z.string(),
});
