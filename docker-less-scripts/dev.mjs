// For developers: services, API and worker from their sources with live reload, and Vite's server in front of the API.
// Keeps its data apart from what start uses (.data/dev unless DATA_DIR says otherwise). Ctrl-C ends everything.
import { execFileSync, spawn } from 'node:child_process';
import { mkdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { createServer } from 'vite';

const scripts = dirname(fileURLToPath(import.meta.url));
const root = dirname(scripts);
const dataDir = process.env.DATA_DIR ?? join(root, '.data', 'dev');
const apiPort = process.env.PORT ?? '8080';
const pagePort = Number(process.env.VITE_PORT ?? '5173');
const fromSource = ['--conditions=source', '--import', 'tsx'];

const readEnvironmentFile = (name) =>
  Object.fromEntries(
    readFileSync(join(dataDir, name), 'utf8')
      .split('\n')
      .filter((line) => line.includes('='))
      .map((line) => [line.slice(0, line.indexOf('=')), line.slice(line.indexOf('=') + 1)]),
  );

const run = (program, args, environment) =>
  execFileSync(program, args, { cwd: root, env: environment, encoding: 'utf8', stdio: ['ignore', 'pipe', 'inherit'] });

const prepare = () => {
  const base = { ...process.env, DATA_DIR: dataDir };
  process.stdout.write(run(join(scripts, 'services'), ['start'], base));
  const { DATABASE_URL, REDIS_URL } = readEnvironmentFile('services.env');
  const { ACCESS_TOKEN_SECRET } = readEnvironmentFile('secrets.env');
  const environment = {
    ...base, DATABASE_URL, REDIS_URL, ACCESS_TOKEN_SECRET,
    OBJECT_STORE_DIR: join(dataDir, 'objects'), WEB_DIST: join(root, 'apps/web/dist'),
    PORT: apiPort, BASE_URL: `http://127.0.0.1:${pagePort}`, LEESIDE_MODE: 'demo', NODE_ENV: 'development',
  };
  mkdirSync(environment.OBJECT_STORE_DIR, { recursive: true });
  environment.DEMO_PASSWORD = run(process.execPath, [join(scripts, 'parts/keep-demo-accounts.mjs'), 'prepare'], environment);
  process.stdout.write(run(process.execPath, [...fromSource, join(scripts, 'migrate.mjs')], environment));
  process.stdout.write(run(process.execPath, [...fromSource, 'apps/api/src/seed-lab.ts', '--demo'], environment));
  return environment;
};

const watch = (file, environment) =>
  spawn(process.execPath, ['--watch', ...fromSource, file], { cwd: root, env: environment, stdio: ['ignore', 'inherit', 'inherit'] });

const environment = prepare();
const children = [watch('apps/api/src/start-server.ts', environment), watch('apps/worker/src/start-worker.ts', environment)];
const api = `http://127.0.0.1:${apiPort}`;
const page = await createServer({
  root: join(root, 'apps/web'),
  configFile: join(root, 'apps/web/vite.config.ts'),
  server: {
    host: '127.0.0.1', port: pagePort, strictPort: true,
    proxy: { '/api': api, '/livez': api, '/readyz': api, '/version': api },
  },
});
await page.listen();
page.printUrls();
process.stdout.write(run(process.execPath, [join(scripts, 'parts/keep-demo-accounts.mjs'), 'show'], environment));

const end = async () => {
  for (const child of children) child.kill('SIGTERM');
  await page.close();
  process.stdout.write(run(join(scripts, 'services'), ['stop'], environment));
  process.exit(0);
};
process.once('SIGINT', end);
process.once('SIGTERM', end);
