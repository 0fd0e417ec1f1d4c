import { spawnSync } from 'node:child_process';
import {
  chmodSync, existsSync, lstatSync, mkdirSync, mkdtempSync, readFileSync, readdirSync, realpathSync, rmSync, statSync, symlinkSync, writeFileSync,
} from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';

const root = join(import.meta.dirname, '../..');
const scripts = join(root, 'docker-less-scripts');
let folder: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'scripts-'));
  // As root the servers run as another user, who must be able to pass through.
  chmodSync(folder, 0o711);
});
afterEach(() => {
  rmSync(folder, { recursive: true });
});

const run = (program: string, args: string[], environment: Record<string, string> = {}) => {
  const { LEESIDE_LOCK_HELD: _held, PORT: _port, DEMO_PASSWORD: _password, ...inherited } = process.env;
  const ended = spawnSync(program, args, {
    encoding: 'utf8', cwd: folder, env: { ...inherited, DATA_DIR: join(folder, 'data'), ...environment },
  });
  return { status: ended.status, out: ended.stdout, complaint: ended.stderr };
};

const services = (...args: string[]) => run(join(scripts, 'services'), args);
const modeOf = (file: string) => statSync(file).mode & 0o777;

describe('services', () => {
  it('start twice without change, survive a kill, keep their data and stop alone', () => {
    expect(services('start').status).toBe(0);
    const addresses = readFileSync(join(folder, 'data/services.env'), 'utf8');
    expect(modeOf(join(folder, 'data/services.env'))).toBe(0o600);
    expect(modeOf(join(folder, 'data/secrets.env'))).toBe(0o600);

    const postmaster = () => Number(readFileSync(join(folder, 'data/postgresql/cluster/postmaster.pid'), 'utf8').split('\n')[0]);
    const first = postmaster();
    expect(services('start').status).toBe(0);
    expect(postmaster()).toBe(first);
    expect(readFileSync(join(folder, 'data/services.env'), 'utf8')).toBe(addresses);

    process.kill(first, 'SIGKILL');
    expect(services('start').status).toBe(0);
    expect(postmaster()).not.toBe(first);
    expect(readFileSync(join(folder, 'data/services.env'), 'utf8')).toBe(addresses);

    const last = postmaster();
    expect(services('stop').status).toBe(0);
    expect(existsSync(`/proc/${last}/cwd`)).toBe(false);
    expect(services('stop').status).toBe(0);
  });

  it('show no secret on an argument list', () => {
    expect(services('start').status).toBe(0);
    try {
      const secrets = readFileSync(join(folder, 'data/secrets.env'), 'utf8').match(/(?<==).+/g) ?? [];
      expect(secrets).toHaveLength(4);
      const commands = readdirSync('/proc').filter((name) => /^\d+$/.test(name)).map((pid) => {
        try {
          return readFileSync(`/proc/${pid}/cmdline`, 'utf8');
        } catch {
          return '';
        }
      });
      expect(commands.some((command) => command.includes('redis-server'))).toBe(true);
      for (const secret of secrets) expect(commands.some((command) => command.includes(secret))).toBe(false);
    } finally {
      services('stop');
    }
  });

  it.runIf(process.getuid?.() === 0)('run as root keep the data behind a link where their user cannot reach the folder', () => {
    chmodSync(folder, 0o700);
    expect(services('start').status).toBe(0);
    const behind = dirname(realpathSync(join(folder, 'data/postgresql')));
    try {
      expect(lstatSync(join(folder, 'data/redis')).isSymbolicLink()).toBe(true);
      expect(behind).toMatch(/^\/var\/lib\/leeside-[0-9a-f]{12}$/);
      expect(readdirSync(behind).sort()).toEqual(['postgresql', 'redis']);
      expect(services('stop').status).toBe(0);
    } finally {
      rmSync(behind, { recursive: true });
    }
  });

  it('say how they are called', () => {
    expect(services('dance')).toMatchObject({ status: 1, complaint: expect.stringContaining('Usage') as string });
  });
});

describe('start', () => {
  it('ends with 1 and the reason when the port is taken', async () => {
    const server = createServer().listen(0, '127.0.0.1');
    await new Promise((resolve) => server.once('listening', resolve));
    const { port } = server.address() as { port: number };
    const { status, complaint } = run(join(scripts, 'start'), [], { PORT: String(port) });
    server.close();
    expect(status).toBe(1);
    expect(complaint).toContain(`Port ${port} is taken`);
  });

  it.each([['PORT', 'http', 'PORT must be a number'], ['PORT', '70000', 'between 1 and 65535'], ['DEMO_PASSWORD', 'short', 'fewer than 8']])(
    'refuses %s=%s before it does anything',
    (name, value, reason) => {
      const { status, complaint } = run(join(scripts, 'start'), [], { PORT: '18999', [name]: value });
      expect(status).toBe(1);
      expect(complaint).toContain(reason);
      expect(existsSync(join(folder, 'data/postgresql'))).toBe(false);
    },
  );
});

describe('the demo accounts', () => {
  const accounts = (environment: Record<string, string> = {}) => {
    mkdirSync(join(folder, 'data'), { recursive: true });
    return run(process.execPath, [join(scripts, 'parts/keep-demo-accounts.mjs'), 'prepare'], { BASE_URL: 'http://127.0.0.1:8080', ...environment }).out;
  };
  const file = () => join(folder, 'data/demo.json');

  it('get a password that is made once and kept, in a file that only its owner reads', () => {
    const password = accounts();
    expect(password.length).toBeGreaterThanOrEqual(16);
    expect(accounts()).toBe(password);
    expect(modeOf(file())).toBe(0o600);
    const kept = JSON.parse(readFileSync(file(), 'utf8')) as { accounts: { email: string }[] };
    expect(kept.accounts.map((account) => account.email.split('@')[0])).toEqual(['engineer', 'analyst', 'qa', 'admin', 'client-a', 'client-b']);
  });

  it('take the password that is given', () => {
    accounts();
    expect(accounts({ DEMO_PASSWORD: 'eight888' })).toBe('eight888');
    expect(accounts()).toBe('eight888');
  });
});

describe('the closing count', () => {
  const files: Record<string, string> = {
    'good.test.mjs': "it('a', () => {});\nit('b', () => {});\nit.skip('c', () => {});\n",
    'bad.test.mjs': "it('a', () => { throw new Error('bad'); });\n",
    'broken.test.mjs': "throw new Error('cannot be loaded');\n",
    'stray.test.mjs': "it('a', async () => { setTimeout(() => { throw new Error('stray'); }); await new Promise((go) => setTimeout(go, 50)); });\n",
    'hook.test.mjs': "describe('d', () => { afterAll(() => { throw new Error('hook'); }); it('a', () => {}); });\n",
  };
  const project = (name: string, include: string) => `{ test: { name: '${name}', include: ['${include}'], globals: true } }`;

  it('adds tests of all suites, files that cannot be loaded, broken hooks and stray errors', () => {
    for (const [name, text] of Object.entries(files)) writeFileSync(join(folder, name), text);
    const projects = [project('one', '{good,bad}.test.mjs'), project('two', '{broken,stray,hook}.test.mjs')].join(', ');
    writeFileSync(join(folder, 'vitest.config.mjs'), `export default { test: { projects: [${projects}] } };\n`);
    symlinkSync(join(root, 'node_modules'), join(folder, 'node_modules'));
    const counts = join(folder, 'counts');
    const vitest = join(root, 'node_modules/vitest/vitest.mjs');
    const reporter = join(scripts, 'parts/count-results.mjs');
    run(process.execPath, [vitest, 'run', '--reporter', reporter], { LEESIDE_COUNTS: counts, VITEST: '', TEST: '' });
    expect(readFileSync(counts, 'utf8')).toBe('4 4\n');
  });
});
