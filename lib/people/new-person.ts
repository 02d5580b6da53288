import { z } from "zod";

/** Somebody who is to have an account: a name, the address that invitations go to, and what they may do on this server. */
export const newPersonSchema = z.strictObject({
  name: z.string().trim().min(1, "Write the name.").max(80, "A name of at most 80 letters."),
  email: z.email("Write the whole address, as name@yard.example.").max(320, "An address of at most 320 letters."),
  isAdministrator: z.boolean(),
  isEngineer: z.boolean(),
});
export type NewPerson = z.infer<typeof newPersonSchema>;
