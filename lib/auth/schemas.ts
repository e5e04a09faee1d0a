import { z } from "zod";

/** What the sign-in form sends. The password's own rule (72 bytes) is checked where it is hashed. */
export const signInSchema = z.object({
  email: z.string("Enter your e-mail address.").trim().toLowerCase().min(1, "Enter your e-mail address.").max(254, "The e-mail address is too long.").pipe(z.email("Enter an e-mail address such as name@canal-workshop.example.")),
  password: z.string("Enter your password.").min(1, "Enter your password.").max(1024, "The password is longer than 72 bytes. Use a shorter one."),
});

export type SignInInput = z.input<typeof signInSchema>;
