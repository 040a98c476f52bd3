import { NextResponse } from 'next/server';
import { z } from 'zod';
import { currentSender, startTry, waitWords } from '@/app/_server/attempts';
import { environment } from '@/app/_server/environment';
import { defineHandler } from '@/app/_server/handler';
import { problem } from '@/app/_server/problem';
import { readLink } from '@/db/queries/mail-links';
import { stopHome } from '@/db/queries/reminder-stops';
import { doUrl } from '@/lib/mail/links';

/** Opened by hand or by a scanner: nothing happens; the page behind it asks first. */
export const GET = defineHandler({
  verb: 'anyone',
  run: ({ params }) => NextResponse.redirect(doUrl(environment().NEXTAUTH_URL, params.token ?? ''), { status: 303, headers: { 'referrer-policy': 'no-referrer' } }),
});

const subject = 'unsubscribe address';

/** The one click of RFC 8058 §3.2: no sign-in, no cookie; the token is the authority. Twice is the same as once. */
export const POST = defineHandler({
  verb: 'anyone',
  reads: 'json or text',
  schema: z.string().refine((body) => body.includes('List-Unsubscribe=One-Click') || /name="?List-Unsubscribe"?\s+One-Click/.test(body), 'must be List-Unsubscribe=One-Click'),
  run: async ({ params }) => {
    const now = new Date();
    const link = readLink(params.token ?? '', now);
    if (typeof link !== 'string' && link.action === 'stop home') {
      stopHome(link.userId, link.homeId, now);
      return { stopped: true };
    }
    const sender = await currentSender();
    const wait = await startTry(`${subject} ${sender}`, sender);
    return wait > 0 ? problem(429, 'Too many tries', waitWords(wait)) : problem(404, 'Not found', 'This address stops nothing.');
  },
});
