import 'server-only';
import { writeMenuFile } from '@/lib/domain/menu-file/write-file';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';

/** The menu as a file to take away; the byte-order mark tells spreadsheets that it is UTF-8. */
export const exportMenu = (actor: Actor): Promise<Response> =>
  actIn(actor, 'site.read', async (transaction) => {
    const site = await readSite(transaction, actor.siteId);
    return new Response(`\ufeff${writeMenuFile(site)}`, {
      headers: { 'Content-Type': 'text/csv; charset=utf-8', 'Content-Disposition': `attachment; filename="${actor.siteId}-menu.csv"`, 'Cache-Control': 'no-store' },
    });
  });
