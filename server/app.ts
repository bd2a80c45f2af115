import { randomUUID } from 'node:crypto';
import express, { type Express, Router } from 'express';
import helmet from 'helmet';
import { pinoHttp } from 'pino-http';
import type { Deps } from './deps.ts';
import { benchRoutes } from './features/bench/routes.ts';
import { cutRoutes } from './features/cuts/routes.ts';
import { designRoutes } from './features/designs/routes.ts';
import { drawingRoutes } from './features/drawings/routes.ts';
import { fitRoutes } from './features/fit/routes.ts';
import { noticeRoutes } from './features/notices/routes.ts';
import { peopleRoutes } from './features/people/routes.ts';
import { reviewRoutes } from './features/review/routes.ts';
import { systemRoutes } from './features/system/routes.ts';
import { takeRoutes } from './features/takes/routes.ts';
import { authRoutes } from './http/auth-routes.ts';
import { requireTrustedOrigin } from './http/origin.ts';
import { noSuchCall, problemHandler } from './http/problem.ts';
import { rateLimits } from './http/rate-limits.ts';

/** The API as an Express application: nothing listens, nothing is global. */
export function createApp(deps: Deps): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', deps.trustProxyHops);
  app.set('query parser', 'simple');
  app.use(securityHeaders(deps.origins[0].startsWith('https:')));
  app.use('/api', api(deps));
  return app;
}

function api(deps: Deps): Router {
  const router = Router();
  const limits = rateLimits();
  router.use(
    pinoHttp({
      logger: deps.log,
      genReqId: () => randomUUID(),
      autoLogging: false,
      // No cookie, address or body of a member goes into a log.
      serializers: {
        req: (request: { id: unknown; method: string; url: string }) => ({
          id: request.id,
          method: request.method,
          url: request.url.split('?')[0]?.replace(/(\/invitations\/)[^/]+/, '$1…'),
        }),
      },
    }),
  );
  router.use(requireTrustedOrigin(deps.origins));
  router.use(express.json({ limit: '256kb' }));
  // Endpoints carry their whole path, as it stands in the contract.
  const calls = Router();
  authRoutes(calls, deps, limits);
  systemRoutes(calls, deps);
  peopleRoutes(calls, deps, limits);
  benchRoutes(calls, deps);
  drawingRoutes(calls, deps, limits);
  designRoutes(calls, deps);
  cutRoutes(calls, deps);
  takeRoutes(calls, deps);
  fitRoutes(calls, deps);
  reviewRoutes(calls, deps);
  noticeRoutes(calls, deps);
  router.use((request, _response, next) => {
    request.url = request.originalUrl;
    next();
  });
  router.use(calls);
  router.use(noSuchCall);
  router.use(problemHandler);
  return router;
}

/** Nothing from elsewhere is loaded, framed or run. Over plain http a browser must not be sent to https. */
function securityHeaders(secure: boolean) {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        // Measured positions are set on the element by the interface library.
        styleSrcAttr: ["'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(secure ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: secure,
    referrerPolicy: { policy: 'same-origin' },
  });
}
