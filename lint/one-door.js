// One library, one door: each of these is imported in one place alone, so that it can be replaced there.

/** Each door, wider ones first: a pattern of package names, and the files that may import them. */
export const doors = [
  { libraries: '(pino|pino-http)', files: ['apps/api/src/**', 'apps/worker/src/**'] },
  { libraries: '(busboy)', files: ['apps/api/src/http/**'] },
  { libraries: '(passport|passport-jwt|jsonwebtoken|@node-rs/argon2)', files: ['apps/api/src/authentication/**'] },
  { libraries: '(bullmq|ioredis)', files: ['packages/job-queue/src/**'] },
  { libraries: '(knex|pg|pg-copy-streams)', files: ['packages/database/src/**', 'migrations/**'] },
  { libraries: '(papaparse)', files: ['packages/trace-reading/src/**'] },
  { libraries: '(uplot)', files: ['apps/web/src/components/**'] },
];

const everyLibrary = doors.map((door) => door.libraries).join('|');

const restrictions = (shutDoors) => ({
  patterns: shutDoors.map(({ libraries, files }) => ({
    regex: `^${libraries}(/|$)`,
    message: `This library has one door: ${files.join(', ')}.`,
  })),
  paths: ['node:process', 'process'].map((name) => ({
    name, importNames: ['env'], message: 'The environment is read in configuration.ts alone.',
  })),
});

/** Rules for all files, then one block for each door that leaves this door open. Doors may lie inside one another. */
export const oneDoorConfigs = () => [
  { rules: { 'no-restricted-imports': ['error', restrictions(doors)] } },
  ...doors.map((door) => ({
    files: door.files,
    rules: {
      'no-restricted-imports': ['error', restrictions(doors.filter((other) => !opensFor(other, door)))],
    },
  })),
];

/** True when every file behind `inner` also lies behind `outer`. */
const opensFor = (outer, inner) =>
  outer === inner || inner.files.every((file) => outer.files.some((wide) => file.startsWith(wide.replace(/\*\*$/, ''))));

/** A dynamic import would walk around the rule on imports. */
export const dynamicImport = {
  selector: `ImportExpression[source.value=/^(${everyLibrary.replaceAll('/', '\\u002F')})$/]`,
  message: 'A library with one door is not imported dynamically.',
};
