import { z } from 'zod';
import { defineMail } from '../letter';

export const resetMail = defineMail({
  kind: 'reset',
  secret: true,
  props: z.object({ name: z.string().nullable(), url: z.url(), hours: z.number().int().positive() }),
  write: ({ name, url, hours }) => ({
    subject: 'Set a new password for Eavewright',
    heading: 'Set a new password',
    courses: [
      {
        parts: [
          { as: 'text', text: `${name ? `${name}, somebody` : 'Somebody'} asked for a new password for the account with this address.` },
          { as: 'text', text: `The link works once, for ${hours} ${hours === 1 ? 'hour' : 'hours'}. A new password signs you out everywhere else.` },
          { as: 'link', label: 'Set a new password', url, look: 'button' },
        ],
      },
    ],
    footer: [{ as: 'text', text: 'You did not ask for it? Then do nothing; the old password stays as it is.' }],
  }),
});
