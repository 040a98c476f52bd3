import { z } from 'zod';
import { defineMail } from '../letter';

export const signInMail = defineMail({
  kind: 'sign-in',
  secret: true,
  props: z.object({ url: z.url(), hours: z.number().int().positive() }),
  write: ({ url, hours }) => ({
    subject: 'Your sign-in link for Eavewright',
    heading: 'Sign in',
    courses: [
      {
        parts: [
          { as: 'text', text: `This link signs you in on the device you open it on. It works once, for ${hours} ${hours === 1 ? 'hour' : 'hours'}.` },
          { as: 'link', label: 'Sign in to Eavewright', url, look: 'button' },
        ],
      },
    ],
    footer: [{ as: 'text', text: 'You did not ask for it? Then do nothing; nobody can sign in without this link.' }],
  }),
});
