import { fileQuery, siteParams } from '@/features/menu/schema';
import { exportMenu } from '@/features/menu/server/export-menu';
import { importMenu } from '@/features/menu/server/import-menu';
import { maxFileBytes } from '@/lib/domain/menu-file/decode-file';
import { route } from '@/lib/server/route';

export const GET = route({ permission: 'site.read', params: siteParams }, (actor) => exportMenu(actor));

export const POST = route(
  { permission: 'menu.write', params: siteParams, query: fileQuery, upload: { maxBytes: maxFileBytes, types: ['application/octet-stream', 'text/csv'] } },
  ({ upload, query, ...actor }) => importMenu(actor, { bytes: upload.bytes, mapping: query.mapping, apply: query.apply }),
);
