import { chmod, mkdir, readFile, writeFile } from 'node:fs/promises';
import { homedir } from 'node:os';
import { dirname, join } from 'node:path';
import { z } from 'zod';
import { CommandFault } from './exit-code.js';

const connectionSchema = z.object({ url: z.url({ protocol: /^https?$/ }), token: z.string().trim().regex(/^[\x21-\x7e]+$/) });
/** Where the server is and by which API token it knows us. */
export type Connection = z.infer<typeof connectionSchema>;

/** The token given in the environment, or null. */
export function tokenFromEnvironment(): string | null {
  return process.env['LEESIDE_TOKEN'] ?? null;
}

const keptAt = (): string =>
  join(process.env['XDG_CONFIG_HOME'] ?? join(homedir(), '.config'), 'leeside', 'connection.json');

/** Checks an address and a token for their form. */
export function checkConnection(given: { readonly url?: string; readonly token?: string }): Connection {
  const connection = connectionSchema.safeParse(given);
  if (connection.success) return connection.data;
  if (given.url === undefined || given.token === undefined) throw new CommandFault('No server is known yet. Run "leeside login --url URL" or set LEESIDE_URL and LEESIDE_TOKEN.');
  const isUrl = connection.error.issues.some(({ path }) => path[0] === 'url');
  throw new CommandFault(isUrl ? `"${given.url}" is not an address such as https://leeside.example.` : 'The API token holds characters that no token has.');
}

/** Keeps a connection for the commands to come, readable by this user alone; returns the file's name. */
export async function keepConnection(connection: Connection): Promise<string> {
  const file = keptAt();
  await mkdir(dirname(file), { recursive: true, mode: 0o700 });
  await writeFile(file, `${JSON.stringify(connection, null, 2)}\n`, { mode: 0o600 });
  await chmod(file, 0o600);
  return file;
}

async function keptConnection(): Promise<Connection | null> {
  const text = await readFile(keptAt(), 'utf8').catch(() => null);
  if (text === null) return null;
  try {
    return connectionSchema.parse(JSON.parse(text));
  } catch {
    throw new CommandFault(`${keptAt()} is damaged. Run "leeside login --url URL" again.`);
  }
}

/** The connection of the environment or the one that `login` kept. A kept token goes to the server it was kept for, to no other. */
export async function readConnection(): Promise<Connection> {
  const url = process.env['LEESIDE_URL'];
  const token = tokenFromEnvironment();
  if (url !== undefined && token !== null) return checkConnection({ url, token });
  const kept = await keptConnection();
  if (url === undefined) return checkConnection({ ...kept, ...(token === null ? {} : { token }) });
  const { origin } = new URL(checkConnection({ url, token: 'none' }).url);
  if (kept === null || new URL(kept.url).origin !== origin) throw new CommandFault(`No token is known for ${origin}. Run "leeside login --url ${origin}" or set LEESIDE_TOKEN.`);
  return { url, token: kept.token };
}
