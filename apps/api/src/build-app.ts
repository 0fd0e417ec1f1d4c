import { endpoints } from '@leeside/contracts/endpoints';
import cookieParser from 'cookie-parser';
import express, { type Express, type Router } from 'express';
import { pinoHttp } from 'pino-http';
import type { ApiTools } from './api-tools.js';
import { mountAuthentication, mountTokens } from './features/authentication/authentication-routes.js';
import { mountCurves } from './features/curves/curve-routes.js';
import { mountFiles } from './features/files/file-routes.js';
import { mountUpload } from './features/files/upload-route.js';
import { mountIntake } from './features/intake/intake-routes.js';
import { mountLevels } from './features/levels/level-routes.js';
import { operationsRouter } from './features/operations/operations-routes.js';
import { mountRequirements } from './features/requirements/requirement-routes.js';
import { mountSessions } from './features/sessions/session-routes.js';
import { mountToday } from './features/today/today-routes.js';
import { mountTraces } from './features/traces/trace-routes.js';
import { answerProblems, answerUnknownRoute } from './http/answer-problems.js';
import { openApiDocument } from './http/openapi-document.js';
import { requestIdOf, tellRequestId } from './http/request-id.js';
import { securityHeaders } from './http/security-headers.js';
import { servePage } from './http/serve-page.js';

const version = '0.1.0';

/** Every call of the contract on one router. */
export function apiRouter(tools: ApiTools): Router {
  const router = express.Router();
  router.get('/openapi.json', (_request, response) => void response.json(openApiDocument(endpoints, version)));
  for (const mount of [mountAuthentication, mountTokens, mountToday, mountIntake, mountRequirements, mountSessions, mountUpload, mountFiles, mountTraces, mountLevels, mountCurves]) mount(router, tools);
  return router;
}

/** The whole application: the API, what operators ask, and the page. */
export function buildApp(tools: ApiTools): Express {
  const app = express();
  const headers = securityHeaders(tools.baseUrl);
  app.disable('x-powered-by').set('query parser', 'simple').set('etag', false).set('trust proxy', 'loopback');
  app.use(pinoHttp({
    logger: tools.log, genReqId: requestIdOf, quietReqLogger: true,
    serializers: { req: (request: { method: string; url: string; id: string }) => ({ id: request.id, method: request.method, path: request.url.split('?')[0] }), res: (response: { statusCode: number }) => ({ status: response.statusCode }) },
    customLogLevel: (_request, response, fault) => (fault || response.statusCode >= 500 ? 'error' : 'debug'),
  }));
  app.use(tellRequestId);
  app.use(headers.api);
  app.use('/api/v1', cookieParser(), express.json({ limit: '2mb' }), apiRouter(tools), answerUnknownRoute);
  app.use('/api', answerUnknownRoute);
  app.use(operationsRouter(tools, version));
  if (tools.webFolder !== null) app.use(servePage(tools.webFolder, headers.page));
  app.use(answerUnknownRoute);
  app.use(answerProblems(tools));
  return app;
}
