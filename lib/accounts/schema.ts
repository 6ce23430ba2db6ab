/** What the account forms may hold. */
import { z } from "zod";

const PASSWORD_MIN = 10;
/** bcrypt reads no further than this many bytes; a longer password would be cut without a word. */
const PASSWORD_MAX_BYTES = 72;

const email = z
  .email("Type a whole e-mail address, such as name@example.org.")
  .max(254)
  .transform((value) => value.toLowerCase());

const password = z
  .string()
  .min(PASSWORD_MIN, `A password has at least ${PASSWORD_MIN} characters.`)
  .refine((value) => new TextEncoder().encode(value).length <= PASSWORD_MAX_BYTES, {
    message: `A password has at most ${PASSWORD_MAX_BYTES} bytes.`,
  });

export const signUpSchema = z.object({
  name: z.string().trim().min(1, "Say what to call you.").max(120),
  email,
  password,
  shopName: z.string().trim().max(120).optional(),
});

export const signInSchema = z.object({
  email,
  password: z.string().min(1, "Type the password.").max(1_000),
});

export type SignUp = z.infer<typeof signUpSchema>;
export type SignIn = z.infer<typeof signInSchema>;
