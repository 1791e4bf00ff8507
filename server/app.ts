import compression from 'compression';
import express from 'express';
import type { Express, RequestHandler } from 'express';
import helmet from 'helmet';
import { env, publicUrl } from './env';
import { isLoopback } from './loopback';
import { errorHandler } from './middleware/errorHandler';
import { jsonBody } from './middleware/jsonBody';
import { notFoundHandler } from './middleware/notFound';
import { originCheck } from './middleware/originCheck';
import { requestId } from './middleware/requestId';
import { requestLog } from './middleware/requestLog';
import { endStaleSession, passport } from './passport';
import { assessmentsRouter } from './routes/assessments';
import { attachmentsRouter } from './routes/attachments';
import { exportsRouter } from './routes/exports';
import { healthRouter } from './routes/health';
import { devicesRouter } from './routes/devices';
import { passwordResetsRouter } from './routes/passwordResets';
import { registerImportRouter } from './routes/registerImport';
import { rubberGoodsRouter } from './routes/rubberGoods';
import { sessionsRouter } from './routes/sessions';
import { sitesRouter } from './routes/sites';
import { usersRouter } from './routes/users';
import { insightsRouter } from './routes/insights';
import { sessionRouter } from './routes/session';
import { verifyRouter } from './routes/verify';
import { worksheetsRouter } from './routes/worksheets';
import { sessionMiddleware } from './session';
import { webApp } from './web';

/** The whole server as a function of requests; `main.ts` gives it a port, tests call it as it is. */
export function buildApp(): Express {
  const app = express();
  app.disable('x-powered-by');
  // Only worksheets have an ETag, and it is their version.
  app.set('etag', false);
  app.set('trust proxy', env.TRUST_PROXY);
  app.use(requestId, requestLog, securityHeaders(), compression());
  app.use('/api', buildApi());
  app.use(webApp());
  app.use(notFoundHandler);
  app.use(errorHandler);
  return app;
}

function securityHeaders() {
  const production = env.NODE_ENV === 'production' && !isLoopback(new URL(publicUrl()).hostname);
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        // expo-font and react-native-web write style elements.
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(production ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: production,
    referrerPolicy: { policy: 'no-referrer' },
    xFrameOptions: { action: 'deny' },
  });
}

/** What a request is judged by, in this order: body, origin, session, then the route's own rules. */
function buildApi(): express.Router {
  const api = express.Router();
  api.use((_req, res, next) => {
    res.setHeader('Cache-Control', 'no-store');
    next();
  });
  api.use(healthRouter);
  api.use(jsonBody, originCheck);
  api.use(
    sessionMiddleware(),
    passport.initialize() as RequestHandler,
    passport.session() as RequestHandler,
    endStaleSession,
  );
  api.use('/session', sessionRouter);
  api.use('/sessions', sessionsRouter);
  api.use('/password-resets', passwordResetsRouter);
  // Before the routers whose `/:id` these paths would fit as well.
  api.use(registerImportRouter);
  api.use('/users', usersRouter);
  api.use('/sites', sitesRouter);
  api.use('/rubber-goods', rubberGoodsRouter);
  api.use('/devices', devicesRouter);
  api.use('/worksheets', exportsRouter, worksheetsRouter);
  api.use('/assessments', assessmentsRouter);
  api.use('/attachments', attachmentsRouter);
  api.use('/insights', insightsRouter);
  api.use('/verify', verifyRouter);
  api.use(notFoundHandler);
  return api;
}
