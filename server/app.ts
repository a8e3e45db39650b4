import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type Express } from 'express';
import type { Logger } from 'pino';

import { Access } from './auth/Access.ts';
import type { PasswordHasher } from './auth/PasswordHasher.ts';
import { SessionTokens } from './auth/SessionTokens.ts';
import { signInLimiter, type SignInLimit } from './auth/signInLimiter.ts';
import { Computing } from './compute/Computing.ts';
import { ResultFiles } from './compute/ResultFiles.ts';
import type { Runner } from './compute/Runner.ts';
import { ApiRouter } from './http/ApiRouter.ts';
import { errorHandler } from './http/errorHandler.ts';
import { notFound } from './http/HttpError.ts';
import { refuseDeepBodies } from './http/refuseDeepBodies.ts';
import { refuseNullCharacters } from './http/refuseNullCharacters.ts';
import { refuseOtherBodies } from './http/refuseOtherBodies.ts';
import { requestLog } from './http/requestLog.ts';
import { securityHeaders } from './http/securityHeaders.ts';
import { servePages } from './http/servePages.ts';
import { acknowledgmentsRoutes } from './routes/acknowledgments/acknowledgments.routes.ts';
import { buildingsRoutes } from './routes/buildings/buildings.routes.ts';
import { healthRoutes } from './routes/health/health.routes.ts';
import { resultsRoutes } from './routes/results/results.routes.ts';
import { scheduleRoutes } from './routes/schedule/schedule.routes.ts';
import { sessionRoutes } from './routes/session/session.routes.ts';
import { tablesRoutes } from './routes/tables/tables.routes.ts';
import { undoRoutes } from './routes/undo/undo.routes.ts';
import { uploadsRoutes } from './routes/uploads/uploads.routes.ts';
import type { Context } from './services/Context.ts';
import { createServices, type Services } from './services/Services.ts';

export interface AppDependencies extends Context {
  readonly hasher: PasswordHasher;
  readonly sessionSecret: string;
  /** PUBLIC_URL is https: secure cookies and HSTS */
  readonly overTls: boolean;
  readonly signInLimit: SignInLimit;
  readonly logger: Logger;
  readonly runner: Runner;
  /** folder for computed results; null: kept in memory only */
  readonly resultFolder: string | null;
  /** tells builds of the engine apart, so that no result of an older one is shown */
  readonly engineBuild: string;
  /** folder of the built client; null: the API alone */
  readonly pagesRoot: string | null;
}

export interface App {
  readonly express: Express;
  /** what the running router answers to; a test compares it with the permission matrix */
  readonly routes: ApiRouter['registered'];
  readonly services: Services;
}

export function createApp(dependencies: AppDependencies): App {
  const { gate, now, hasher, sessionSecret, overTls, signInLimit, logger, pagesRoot, resultFolder } = dependencies;
  const tokens = new SessionTokens(sessionSecret, overTls);
  const files = resultFolder === null ? null : new ResultFiles(resultFolder);
  const computing = new Computing(dependencies.runner, files);
  const services = createServices(dependencies, hasher, computing, dependencies.engineBuild);
  const api = new ApiRouter(new Access(gate, tokens, now));
  healthRoutes(api, services);
  sessionRoutes(api, services, tokens, signInLimiter(signInLimit));
  buildingsRoutes(api, services);
  tablesRoutes(api, services);
  uploadsRoutes(api, services);
  resultsRoutes(api, services);
  scheduleRoutes(api, services);
  acknowledgmentsRoutes(api, services);
  undoRoutes(api, services);

  const app = express();
  app.disable('x-powered-by');
  app.set('etag', false);
  app.set('query parser', 'simple');
  if (overTls) app.set('trust proxy', 1);
  app.use(requestLog(logger, dependencies.newId));
  app.use(securityHeaders(overTls));
  app.use(compression());
  app.use(cookieParser());
  app.use(
    '/api',
    express.json({ limit: '16mb', strict: false, verify: refuseNullCharacters }),
    refuseOtherBodies,
    refuseDeepBodies,
    (_request, response, next) => {
      response.setHeader('Cache-Control', 'no-store');
      next();
    },
  );
  app.use(api.router);
  app.use('/api', () => {
    throw notFound();
  });
  if (pagesRoot !== null) app.use(servePages(pagesRoot));
  app.use(errorHandler(logger));
  return { express: app, routes: api.registered, services };
}
