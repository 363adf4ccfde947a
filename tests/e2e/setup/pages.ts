import { readdirSync } from 'node:fs';
import path from 'node:path';
import mariadb from 'mariadb';
import { told } from './product';

/** `name` is the route as the folder says it, `address` a page of the demo that it answers. */
export type DemoPage = { readonly name: string; readonly address: string; readonly atTheDoor: boolean };

const app = path.resolve(import.meta.dirname, '../../../app');

/** Some row of the demo for a part of a route in brackets. */
const rowFor: Readonly<Record<string, string>> = {
  plan: 'SELECT id FROM plans WHERE site_id = ? ORDER BY id LIMIT 1',
  printer: 'SELECT id FROM printers WHERE site_id = ? ORDER BY id LIMIT 1',
  station: 'SELECT id FROM stations WHERE site_id = ? ORDER BY id LIMIT 1',
  till: 'SELECT id FROM tills WHERE site_id = ? ORDER BY id LIMIT 1',
  section: 'SELECT id FROM sections WHERE site_id = ? ORDER BY id LIMIT 1',
  item: 'SELECT id FROM items WHERE site_id = ? ORDER BY id LIMIT 1',
  area: 'SELECT id FROM areas WHERE site_id = ? ORDER BY id LIMIT 1',
};

/** Pages that are for people who are not signed in. */
const doors = ['/sign-in', '/invitation', '/forgot-password', '/reset-password'];

/** Every page there is, read from the routes: a new one is looked at on the day it is made. A route with a token cannot be guessed and has tests of its own. */
export async function demoPages(siteId: string): Promise<readonly DemoPage[]> {
  const connection = await mariadb.createConnection(told('DATABASE_URL'));
  const valueOf = async (part: string): Promise<string | undefined> => {
    if (part === 'site') return siteId;
    const query = rowFor[part];
    if (!query) return undefined;
    const [row]: readonly { id: string }[] = await connection.query(query, [siteId]);
    return row?.id;
  };
  try {
    const pages: DemoPage[] = [];
    for (const name of routes()) {
      const parts = await Promise.all(name.split('/').map(async (part) => (part.startsWith('[') ? valueOf(part.slice(1, -1)) : part)));
      if (parts.includes(undefined)) continue;
      pages.push({ name, address: parts.join('/') || '/', atTheDoor: doors.some((door) => name.startsWith(door)) });
    }
    return pages;
  } finally {
    await connection.end();
  }
}

function routes(): readonly string[] {
  return readdirSync(app, { recursive: true, encoding: 'utf8' })
    .filter((file) => path.basename(file) === 'page.tsx')
    .map((file) => path.dirname(file).split(path.sep).filter((part) => part !== '.' && !/^\(.*\)$/.test(part)))
    .map((parts) => `/${parts.join('/')}`)
    .sort();
}
