import { z } from "zod";

export const roles = ["therapist", "intensivist", "nurse"] as const;

export type Role = (typeof roles)[number];

export const meSchema = z.object({
  user: z.object({ id: z.string(), name: z.string(), email: z.string() }),
  administrator: z.boolean(),
  session: z.object({ endsAt: z.string(), lastActionAt: z.string() }),
  units: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      timeZone: z.string(),
      gasUnit: z.enum(["mmHg", "kPa"]),
      role: z.enum(roles).nullable(),
      lead: z.boolean(),
      beds: z.array(z.object({ id: z.string(), label: z.string(), patientId: z.string().nullable() })),
    }),
  ),
});

export type Me = z.infer<typeof meSchema>;

export const unlockBodySchema = z.strictObject({ password: z.string().min(1, "Enter your password.").max(200) });

export const activityBodySchema = z.strictObject({});

export const sessionAnswerSchema = z.object({ lastActionAt: z.string() });

/** Sign-in form; next-auth's `credentials` provider takes the same two fields. */
export const signInSchema = z.object({
  email: z.email("Enter the e-mail address you were invited with."),
  password: z.string().min(1, "Enter your password.").max(200),
});
