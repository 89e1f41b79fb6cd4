import { z } from "zod";

const email = z
  .email("Write an address such as name@example.com.")
  .max(254, "An address has at most 254 characters.")
  .transform((value) => value.trim().toLowerCase());

export const signInSchema = z.object({
  email: z.string("Write your e-mail address.").min(1),
  password: z.string("Write your password.").min(1),
  to: z.string().optional(),
});

const name = z
  .string("Write your name, as it stands on a memo.")
  .trim()
  .min(2, "Write at least two characters.")
  .max(120, "Use at most 120 characters.");

const password = z
  .string("Choose a password.")
  .min(12, "Use at least 12 characters; a few words in a row are easy to keep.")
  .max(256, "Use at most 256 characters.");

export const forgotPasswordSchema = z.object({ email: z.preprocess((value) => value ?? "", email) });

export const newPasswordSchema = z.object({ password });

export const newcomerSchema = z.object({ name, password });

export const signUpSchema = z.object({
  organisationName: z
    .string("Write the name of your organisation.")
    .trim()
    .min(2, "Write at least two characters.")
    .max(120),
  name,
  email: z.preprocess((value) => value ?? "", email),
  password,
});
