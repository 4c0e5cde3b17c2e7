import { z } from 'zod';

export const credentialsSchema = z.object({
  email: z
    .string()
    .trim()
    .max(254)
    .pipe(z.email({ error: 'E-mail: type an address such as name@example.org.' }))
    .meta({ label: 'E-mail' }),
  password: z.string().min(1, { error: 'Password: type it.' }).meta({ label: 'Password' }),
});
