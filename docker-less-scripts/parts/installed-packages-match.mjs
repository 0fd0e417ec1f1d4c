// Exits 0 when node_modules already holds what package-lock.json asks for, so that no installation is needed.
// npm writes its own record (.package-lock.json) as the last step of an installation: half an installation has none.
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const root = process.argv[2];
const readPackages = (path) => JSON.parse(readFileSync(path, 'utf8')).packages ?? {};

const installedPath = join(root, 'node_modules', '.package-lock.json');
if (!existsSync(installedPath)) process.exit(1);

const wanted = readPackages(join(root, 'package-lock.json'));
const installed = readPackages(installedPath);

const isSame = ([path, entry]) => {
  if (!path.startsWith('node_modules/') && !path.includes('/node_modules/')) return true;
  const found = installed[path];
  if (found === undefined) return entry.optional === true;
  return found.version === entry.version && found.integrity === entry.integrity && existsSync(join(root, path));
};

process.exit(Object.entries(wanted).every(isSame) ? 0 : 1);
