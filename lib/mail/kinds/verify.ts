import { z } from 'zod';
import { defineMail } from '../letter';

export const verifyMail = defineMail({
  kind: 'verify',
  secret: true,
  props: z.object({ name: z.string().nullable(), url: z.url(), hours: z.number().int().positive() }),
  write: ({ name, url, hours }) => ({
    subject: 'Confirm your address for Eavewright',
    heading: 'Confirm your address',
    courses: [
      {
        parts: [
          { as: 'text', text: name ? `${name}, somebody (you, we hope) made an Eavewright account with this address.` : 'Somebody (you, we hope) made an Eavewright account with this address.' },
          { as: 'text', text: `Confirm that the address is yours, so that reminders reach you. The link works once, for ${hours} hours.` },
          { as: 'link', label: 'Confirm this address', url, look: 'button' },
        ],
      },
    ],
    footer: [{ as: 'text', text: 'It was not you? Then do nothing: without the confirmation no reminders are sent here.' }],
  }),
});
