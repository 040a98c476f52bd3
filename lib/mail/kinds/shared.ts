import { z } from 'zod';
import { keysOf, memberships } from '@/lib/schemas/vocabulary';
import { defineMail } from '../letter';

const mayDo = {
  owner: 'You are its owner now: the home, its walls and its records are in your hands.',
  'co-owner': 'You can see its plan, change its walls and log work.',
  caretaker: 'You can see its plan and log work on it.',
  contractor: 'You can see its walls, what is coming and when, and log the work you do; that restarts the clock of those walls.',
} as const;

export const sharedMail = defineMail({
  kind: 'shared',
  props: z.object({
    homeName: z.string().min(1),
    place: z.string().nullable(),
    byName: z.string().min(1),
    membership: z.enum(keysOf(memberships)),
    url: z.url(),
  }),
  write: ({ homeName, place, byName, membership, url }) => ({
    subject: `${byName} shared ${homeName} with you`,
    heading: `${homeName} was shared with you`,
    courses: [
      {
        title: homeName,
        aside: place ?? undefined,
        parts: [
          { as: 'text', text: `${byName} shared this home with you on Eavewright, as ${memberships[membership].toLowerCase()}.` },
          { as: 'text', text: mayDo[membership] },
          { as: 'link', label: 'Open the home', url, look: 'button' },
        ],
      },
    ],
    footer: [{ as: 'text', text: `You get this because ${byName} entered your address. You do not know them? Then ignore it.` }],
  }),
});
