import { defineHandler } from '@/app/_server/handler';
import { logFault } from '@/app/_server/log';
import { health } from '@/db/queries/health';

export const dynamic = 'force-dynamic';

/** 200 when the service can work, 503 when its database does not answer. */
export const GET = defineHandler({
  verb: 'anyone',
  run: () => {
    try {
      return { ok: true, ...health(new Date()) };
    } catch (error) {
      logFault(error);
      return Response.json({ ok: false, database: 'down' }, { status: 503 });
    }
  },
});
