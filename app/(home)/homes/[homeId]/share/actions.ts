'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { after } from 'next/server';
import { defineAction, FieldFault } from '@/app/_server/action';
import { environment } from '@/app/_server/environment';
import { say } from '@/app/_server/said';
import { homeOf } from '@/db/queries/homes';
import { enqueueMail } from '@/db/queries/mail';
import { shareHome, withdrawShare } from '@/db/queries/sharing';
import { deliverMail } from '@/jobs/deliver';
import { sharedUrl } from '@/lib/mail/links';
import { shareFault } from '@/lib/home/share-fault';
import { shareSchema, withdrawSchema } from '@/lib/schemas/sharing';

export const share = defineAction({
  verb: 'home.share',
  schema: shareSchema,
  run: (actor, { homeId, email, membership }) => {
    const { home } = homeOf(actor, homeId, 'home.share');
    const outcome = shareHome(actor, homeId, email, membership);
    if (!outcome.shared) return new FieldFault({ email: shareFault(outcome.why, membership) });
    return enqueueMail({
      kind: 'shared',
      idempotencyKey: `shared:${homeId}:${outcome.userId}:${Date.now()}`,
      toAddress: email,
      userId: outcome.userId,
      homeId,
      props: { homeName: home.name, place: `${home.place}, ${home.state}`, byName: actor.name ?? actor.email, membership, url: sharedUrl(environment().NEXTAUTH_URL, homeId, membership) },
    });
  },
  after: async (mailId, { homeId, email }) => {
    after(() => deliverMail(mailId));
    await say(`${email} can see this home now. We tell them by e-mail.`);
    redirect(`/homes/${homeId}/share`);
  },
});

export const withdraw = defineAction({
  verb: 'home.share',
  schema: withdrawSchema,
  run: (actor, { homeId, userId }) => {
    if (!withdrawShare(actor, homeId, userId)) return new FieldFault({ '': 'This person has no access that could be ended.' });
  },
  after: (_, { homeId }) => revalidatePath(`/homes/${homeId}/share`),
});
