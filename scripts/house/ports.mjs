import { createServer } from 'node:net';
import { keep, readKept } from './keep-json.mjs';
import { Sentence } from './sentence.mjs';

export const loopback = '127.0.0.1';

/** Asks the system itself: a listener is opened and closed again. Returns the port, or the reason as an error code. */
function tryPort(port, host) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', (error) => resolve({ code: error.code }));
    server.listen({ port, host, exclusive: true }, () => {
      const found = server.address().port;
      server.close(() => resolve({ port: found }));
    });
  });
}

export const freePort = async () => (await tryPort(0, loopback)).port;

export const isFree = async (port, host = loopback) => 'port' in (await tryPort(port, host));

/**
 * The port that a private service had last time, or another when somebody else took it meanwhile: nobody types these.
 * @param {{ ports: string }} home
 * @param {string} service
 */
export async function rememberedPort(home, service) {
  const known = readKept(home.ports) ?? {};
  if (known[service] && (await isFree(known[service]))) return known[service];
  const port = await freePort();
  keep(home.ports, { ...known, [service]: port });
  return port;
}

/** PORT as people type it. */
export function readPort(text, otherwise) {
  if (text === undefined || text === '') return otherwise;
  const port = Number(text);
  if (!/^\d{1,5}$/.test(text) || port < 1 || port > 65_535)
    throw new Sentence(`PORT is "${text}", which is no port; give a number from 1 to 65535, such as PORT=3001.`);
  return port;
}

/** The web server's port is typed by people, so it is never swapped for another one silently. */
export async function mustBeFree(port, host) {
  const { code } = await tryPort(port, host);
  if (code === undefined) return;
  const other = port < 65_535 ? port + 1 : 3000;
  if (code === 'EACCES')
    throw new Sentence(`Only root may listen on port ${port}; start Tamis on another with "PORT=3000 npm start". Nothing was changed.`);
  if (code === 'EADDRINUSE')
    throw new Sentence(`Port ${port} is in use by another program, so Tamis did not start; stop that program or use another port with "PORT=${other} npm start". Nothing was changed.`);
  throw new Sentence(`Tamis cannot listen on ${host} port ${port} (${code}); give an address of this machine in HOST. Nothing was changed.`);
}
