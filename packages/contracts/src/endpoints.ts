import * as authentication from './authentication.js';
import * as curves from './curves.js';
import type { Endpoint } from './endpoint.js';
import * as files from './files.js';
import * as intake from './intake.js';
import * as levels from './levels.js';
import * as requirements from './requirements.js';
import * as samples from './samples.js';
import * as sessions from './sessions.js';
import * as today from './today.js';
import * as traces from './traces.js';

const isEndpoint = (value: unknown): value is Endpoint =>
  typeof value === 'object' && value !== null && 'method' in value && 'path' in value && 'access' in value;

/** Every call of the API. A route that is not listed here does not exist. */
export const endpoints: readonly Endpoint[] = [
  authentication, today, intake, samples, requirements, sessions, files, traces, levels, curves,
].flatMap((feature) => Object.values(feature).filter(isEndpoint));
