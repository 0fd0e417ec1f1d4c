import { chmod, mkdir, readFile, writeFile } from 'node:fs/promises';
import { homedir } from 'node:os';
import { dirname, join } from 'node:path';
import { z } from 'zod';
import { CommandFault } from './exit-code.js';

const connectionSchema = z.object({ url: z.url(), token: z.string().min(1) });
/** Where the server is and by which API token it knows us. */
export type Connection = z.infer<typeof connectionSchema>;

/** The token given in the environment, or null. */
export function tokenFromEnvironment(): string | null {
  return process.env['LEESIDE_TOKEN'] ?? null;
}

const keptAt = (): string =>
  join(process.env['XDG_CONFIG_HOME'] ?? join(homedir(), '.config'), 'leeside', 'connection.json');

/** Keeps a connection for the commands to come, readable by this user alone; returns the file's name. */
export async function keepConnection(connection: Connection): Promise<string> {
  const file = keptAt();
  await mkdir(dirname(file), { recursive: true, mode: 0o700 });
  await writeFile(file, `${JSON.stringify(connection, null, 2)}\n`, { mode: 0o600 });
  await chmod(file, 0o600);
  return file;
}

/** The connection of the environment or the one that `login` kept. */
export async function readConnection(): Promise<Connection> {
  const url = process.env['LEESIDE_URL'];
  const token = tokenFromEnvironment();
  const kept = url !== undefined && token !== null ? null : await readFile(keptAt(), 'utf8').catch(() => null);
  const connection = connectionSchema.safeParse({ ...(kept === null ? {} : JSON.parse(kept)), ...(url === undefined ? {} : { url }), ...(token === null ? {} : { token }) });
  if (!connection.success) throw new CommandFault('No server is known yet. Run "leeside login --url URL" or set LEESIDE_URL and LEESIDE_TOKEN.');
  return connection.data;
}
