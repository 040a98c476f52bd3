import { z } from 'zod';
import { defineMail } from '../letter';

export const alreadyKnownMail = defineMail({
  kind: 'already-known',
  props: z.object({ name: z.string().nullable(), signInUrl: z.url(), forgotUrl: z.url() }),
  write: ({ name, signInUrl, forgotUrl }) => ({
    subject: 'You already have an Eavewright account',
    heading: 'You have an account',
    courses: [
      {
        parts: [
          { as: 'text', text: `${name ? `${name}, somebody` : 'Somebody'} (you, we suppose) tried to make an account with this address. There is one already, and nothing was changed.` },
          { as: 'link', label: 'Sign in', url: signInUrl, look: 'button' },
          { as: 'link', label: 'Set a new password', url: forgotUrl },
        ],
      },
    ],
    footer: [{ as: 'text', text: 'It was not you? Then there is nothing to do.' }],
  }),
});
