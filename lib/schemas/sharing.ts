import { z } from 'zod';
import { choice, neededText } from '@/lib/schemas/measures';

export const shareSchema = z.object({
  homeId: neededText('The home', 60),
  email: z.string({ error: 'The e-mail address is missing.' }).trim().toLowerCase().pipe(z.email('This does not look like an e-mail address.')),
  membership: choice(['contractor', 'caretaker', 'co-owner'], 'what the person is to this home'),
});

export const withdrawSchema = z.object({ homeId: neededText('The home', 60), userId: neededText('The person', 60) });
