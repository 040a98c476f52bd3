import { defineHandler } from '@/app/_server/handler';
import { logFault } from '@/app/_server/log';
import { health } from '@/db/queries/health';

export const dynamic = 'force-dynamic';

const unwell = (body: object) => Response.json(body, { status: 503, headers: { 'cache-control': 'no-store' } });

/** 200 when the service can work; 503 when its database does not answer or lacks a migration. */
export const GET = defineHandler({
  verb: 'anyone',
  run: () => {
    try {
      const found = health(new Date());
      return found.ok ? found : unwell(found);
    } catch (error) {
      logFault(error);
      return unwell({ ok: false, database: 'down' });
    }
  },
});
