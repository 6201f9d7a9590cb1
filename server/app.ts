import express, { Router, type Express } from 'express';
import type { Knex } from 'knex';
import { pino, type Logger } from 'pino';

import { API_ROOT } from '@/shared/contracts/contract';
import { getHealth } from '@/shared/contracts/health';
import type { Config } from './config';
import { authenticate } from './http/authenticate';
import { createLimits } from './http/limits';
import { noSuchAddress, problemHandler } from './http/problem-handler';
import { requestLog } from './http/request-log';
import { route } from './http/route';
import { securityHeaders } from './http/security-headers';
import { staticFiles } from './http/static-files';
import { authRoutes } from './routes/auth-routes';
import { crewRoutes } from './routes/crew-routes';
import { eventRoutes } from './routes/event-routes';
import { jobFileRoutes } from './routes/job-file-routes';
import { jobRoutes } from './routes/job-routes';
import { layoutRoutes } from './routes/layout-routes';
import { meRoutes } from './routes/me-routes';
import { nestRoutes } from './routes/nest-routes';
import { rackRoutes } from './routes/rack-routes';
import { revisionRoutes } from './routes/revision-routes';
import { sheetRoutes } from './routes/sheet-routes';
import { shopRoutes } from './routes/shop-routes';
import { stockRoutes } from './routes/stock-routes';
import { workRoutes } from './routes/work-routes';
import { createAccessTokens } from './services/access-tokens';
import { AuthService } from './services/auth-service';
import { CrewService } from './services/crew-service';
import { EventHub } from './services/event-hub';
import { checkHealth } from './services/health-service';
import { InvitationService } from './services/invitation-service';
import { JobFileService } from './services/job-file-service';
import { JobService } from './services/job-service';
import { LayoutService } from './services/layout-service';
import { NestService } from './services/nest-service';
import { openApiDocument } from './services/openapi';
import { RackService } from './services/rack-service';
import { RevisionService } from './services/revision-service';
import { SheetService } from './services/sheet-service';
import { ShopService } from './services/shop-service';
import { StockService } from './services/stock-service';
import { WorkService } from './services/work-service';
import { NestPool } from './work/nest-pool';

/** A layout with 60 walls, 300 notes and 800 pieces of stock stays well under this. */
const LARGEST_BODY = '4mb';

export interface AppOptions {
  readonly config: Config;
  readonly db: Knex;
  readonly log?: Logger;
  /** Folder of the built web app; the API alone without it. */
  readonly webRoot?: string;
}

/** Puts the whole program together behind one Express app. It listens to nothing and closes nothing. */
export function createApp({ config, db, log = pino({ level: config.logLevel }), webRoot }: AppOptions): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('etag', 'strong');
  // A proxy on this machine puts the caller's address into a header; from elsewhere anybody could write one.
  app.set('trust proxy', 'loopback');
  app.use(requestLog(log));
  app.use(securityHeaders());
  app.use(API_ROOT, api(config, db, log), noSuchAddress(), problemHandler(log));
  if (webRoot) app.use(staticFiles(webRoot));
  return app;
}

function api(config: Config, db: Knex, log: Logger): Router {
  const limits = createLimits();
  const tokens = createAccessTokens(config.tokenSecret);
  const router = Router();
  router.use(limits.requests, express.json({ limit: LARGEST_BODY, strict: true }), authenticate(tokens));

  const auth = new AuthService(db, tokens, config.publicUrl);
  const crew = new CrewService(db);
  const nests = new NestService(db, new NestPool());
  router.use(
    authRoutes(auth, limits, config.publicUrl.startsWith('https:')),
    meRoutes(crew),
    crewRoutes(crew, new InvitationService(db, config.publicUrl)),
    shopRoutes(new ShopService(db)),
    jobRoutes(new JobService(db, log)),
    jobFileRoutes(new JobFileService(db, log)),
    layoutRoutes(new LayoutService(db, log)),
    revisionRoutes(new RevisionService(db)),
    nestRoutes(nests),
    sheetRoutes(new SheetService(db, nests, config.publicUrl)),
    stockRoutes(new StockService(db)),
    rackRoutes(new RackService(db)),
    workRoutes(new WorkService(db)),
    eventRoutes(new EventHub(db)),
  );
  route(router, getHealth, 200, () => checkHealth(db));
  const document = openApiDocument();
  router.get('/openapi.json', (_req, res) => {
    res.json(document);
  });
  return router;
}
