// Spellings that belong to one place: decibel conversions to packages/units, the environment to configuration.ts.
import { dynamicImport } from './one-door.js';

const inUnits = 'Decibels are converted in packages/units alone.';
const decibels = [
  { selector: "MemberExpression[object.name='Math'][property.name=/^(log10|LN10|LOG10E)$/]", message: inUnits },
  { selector: "VariableDeclarator[init.name='Math']", message: inUnits },
  { selector: "BinaryExpression[operator='**'][left.value=10]", message: inUnits },
  { selector: "CallExpression[callee.object.name='Math'][callee.property.name='pow'][arguments.0.value=10]", message: inUnits },
];

const environment = [
  { selector: "MemberExpression[object.name='process'][property.name='env']", message: 'The environment is read in configuration.ts alone.' },
  { selector: "VariableDeclarator[init.name='process']", message: 'The environment is read in configuration.ts alone.' },
];

/** The rule for files that may convert decibels, or read the environment, or neither. */
export const restrictedSyntax = ({ mayConvert = false, mayReadEnvironment = false } = {}) => ({
  'no-restricted-syntax': [
    'error',
    dynamicImport,
    ...(mayConvert ? [] : decibels),
    ...(mayReadEnvironment ? [] : environment),
  ],
});
