import { createInterface } from 'node:readline/promises';
import { getMe } from '@leeside/contracts/authentication';
import { checkConnection, keepConnection, tokenFromEnvironment } from './configuration.js';
import { CommandFault } from './exit-code.js';
import { askServer } from './server-call.js';

async function askForToken(): Promise<string> {
  const given = tokenFromEnvironment();
  if (given !== null) return given;
  const prompt = createInterface({ input: process.stdin, output: process.stderr });
  const token = (await prompt.question('API token: ')).trim();
  prompt.close();
  if (token === '') throw new CommandFault('No token was given.');
  return token;
}

/** Checks a token against the server and keeps both for the commands to come. */
export async function login(url: string): Promise<string> {
  const connection = checkConnection({ url, token: await askForToken() });
  const { user } = await askServer(connection, '/auth/me', getMe.answers[200]);
  const file = await keepConnection(connection);
  return `Signed in as ${user.name} (${user.roles.join(', ')}) of ${user.labName}. Kept in ${file}.`;
}
