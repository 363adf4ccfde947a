/** Enough for a demo; a house with more people has real ones, whose passwords are nobody's to print. */
const mostPeople = 40;

/**
 * The people of the database whom the demo password lets in, per site and role.
 * @param {{ DATABASE_URL: string, TAMIS_DEMO_PASSWORD: string }} settings
 * @returns {Promise<Array<{ email: string, name: string, site: string, siteId: string, role: string, title: string }>>}
 */
export async function demoPeople({ DATABASE_URL, TAMIS_DEMO_PASSWORD }) {
  const { default: mariadb } = await import('mariadb');
  const { verify } = await import('@node-rs/argon2');
  const connection = await mariadb.createConnection(DATABASE_URL);
  let rows;
  try {
    rows = await connection.query(
      `SELECT person.email, person.name, person.password_hash AS hash, site.name AS site, site.id AS siteId, member.role, member.title
         FROM people person JOIN memberships member ON member.person_id = person.id JOIN sites site ON site.id = member.site_id
        ORDER BY site.name, FIELD(member.role, 'owner', 'chef', 'installer', 'trainer'), person.name LIMIT ?`,
      [mostPeople],
    );
  } finally {
    await connection.end();
  }
  const hashes = [...new Set(rows.map(({ hash }) => hash))];
  const opens = new Map(await Promise.all(hashes.map(async (hash) => [hash, await verify(hash, TAMIS_DEMO_PASSWORD).catch(() => false)])));
  return rows.filter(({ hash }) => opens.get(hash)).map(({ email, name, site, siteId, role, title }) => ({ email, name, site, siteId, role, title }));
}

/** "owner at Lantern Yard", and for somebody of several sites "installer at Lantern Yard and Pilgrim's Oven". */
function placesOf(memberships) {
  const roles = [...new Set(memberships.map(({ role }) => role))];
  const sitesAs = (wanted) => memberships.filter(({ role }) => role === wanted).map(({ site }) => site);
  return roles.map((role) => `${role} at ${sitesAs(role).join(' and ')}`).join(', ');
}

/** The demo people as a table, with the one password that they share. */
export function tableOfSignIns(people, password) {
  if (people.length === 0) return 'Sign in with the account that you were invited with.';
  const emails = [...new Set(people.map(({ email }) => email))];
  const rows = emails.map((email) => {
    const memberships = people.filter((person) => person.email === email);
    return { email, name: memberships[0].name, places: placesOf(memberships) };
  });
  const widthOf = (column) => Math.max(...rows.map((row) => row[column].length));
  const [email, name] = ['email', 'name'].map(widthOf);
  const lines = rows.map((row) => `  ${row.email.padEnd(email)}  ${row.name.padEnd(name)}  ${row.places}`);
  return `Sign in as any of these, with the password ${password}\n\n${lines.join('\n')}`;
}

export async function signInsFor(settings) {
  return tableOfSignIns(await demoPeople(settings), settings.TAMIS_DEMO_PASSWORD);
}
