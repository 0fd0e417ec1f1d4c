import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { demoLabFiles } from './demo-lab/demo-lab-files.js';
import { firstSessionFiles } from './demo-lab/first-session-files.js';

const here = dirname(fileURLToPath(import.meta.url));

function writeFolder(name: string, files: Map<string, Uint8Array>): void {
  const folder = join(here, name);
  rmSync(folder, { recursive: true, force: true });
  let bytes = 0;
  for (const [path, content] of files) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), content);
    bytes += content.byteLength;
  }
  console.log(`${name}: ${files.size.toString()} files, ${Math.round(bytes / 1000).toString()} kB`);
}

writeFolder('demo', demoLabFiles());
writeFolder('first-session', firstSessionFiles());
