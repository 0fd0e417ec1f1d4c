// A file wears the name of the one idea in it: kebab-case (a component may be PascalCase), and never a name that says nothing.
import { basename } from 'node:path';

const vagueNames = new Set([
  'util', 'utils', 'helper', 'helpers', 'common', 'shared', 'type', 'types', 'model', 'models', 'hook', 'hooks', 'misc', 'index',
]);
const kebabCase = /^[a-z0-9]+(-[a-z0-9]+)*$/;
const pascalCase = /^[A-Z][A-Za-z0-9]*$/;
const migrationName = /^\d{4}_[a-z0-9]+(_[a-z0-9]+)*$/;

/** The name without its ending or endings: `read-trace-file.test.ts` gives `read-trace-file`. */
const nameOf = (file) => basename(file).replace(/^\./, '').split('.')[0];

const isWellFormed = (file, name) =>
  kebabCase.test(name) ||
  (/\.tsx$/.test(file) && pascalCase.test(name)) ||
  (/[\\/]migrations[\\/]/.test(file) && migrationName.test(name));

export const fileNameRule = {
  meta: {
    type: 'problem',
    schema: [],
    messages: {
      vague: '"{{name}}" says nothing about what is inside: name the file after what it exports.',
      form: '"{{name}}" is not in kebab-case.',
    },
  },
  create: (context) => ({
    Program(node) {
      const file = context.filename;
      const name = nameOf(file);
      if (vagueNames.has(name.toLowerCase())) context.report({ node, messageId: 'vague', data: { name } });
      else if (!isWellFormed(file, name)) context.report({ node, messageId: 'form', data: { name } });
    },
  }),
};
