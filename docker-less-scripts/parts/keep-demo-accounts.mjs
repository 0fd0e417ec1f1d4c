// The demo accounts and their one password in DATA_DIR/demo.json (0600).
//   prepare  checks DEMO_PASSWORD from the environment, or takes the kept one, or makes one; prints it
//   show     prints the accounts for people to read
import { randomInt } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const file = join(process.env.DATA_DIR, 'demo.json');
const names = ['engineer', 'analyst', 'qa', 'admin', 'client-a', 'client-b'];
const shortestPassword = 8;
// Without letters that are taken for one another.
const letters = 'abcdefghjkmnpqrstuvwxyz23456789';

const makePassword = () => {
  const group = () => Array.from({ length: 4 }, () => letters[randomInt(letters.length)]).join('');
  return [group(), group(), group(), group()].join('-');
};

const keptPassword = () => (existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')).password : undefined);

const prepare = () => {
  const asked = process.env.DEMO_PASSWORD;
  if (asked && [...asked].length < shortestPassword) {
    console.error(`DEMO_PASSWORD has fewer than ${shortestPassword} characters.`);
    process.exit(1);
  }
  const password = asked || keptPassword() || makePassword();
  const accounts = names.map((name) => ({ email: `${name}@leeside.example`, password }));
  const content = { url: process.env.BASE_URL, password, accounts };
  writeFileSync(`${file}.draft`, `${JSON.stringify(content, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${file}.draft`, file);
  process.stdout.write(password);
};

const show = () => {
  const { accounts, password } = JSON.parse(readFileSync(file, 'utf8'));
  console.log('Demo accounts, all with one password:');
  for (const { email } of accounts) console.log(`  ${email}`);
  console.log(`Password: ${password}`);
};

if (process.argv[2] === 'prepare') prepare();
else show();
