/** The ordered list of middleware and routes, nothing else. */
import compression from 'compression';
import express, { type Express } from 'express';
import { contractRoutes } from './features/contract/routes';
import { devicesRoutes } from './features/devices/routes';
import { entriesRoutes } from './features/entries/routes';
import { jobsRoutes } from './features/jobs/routes';
import { devMailRoutes } from './features/mail/devMail';
import { healthRoutes } from './features/health/routes';
import { readiness } from './features/health/service';
import { panelsRoutes } from './features/panels/routes';
import { peopleRoutes } from './features/people/routes';
import { recordsRoutes } from './features/records/routes';
import { sessionRoutes } from './features/sessions/routes';
import { sitesRoutes } from './features/sites/routes';
import { clientShell, staticClient } from './http/client';
import { crossSite } from './http/crossSite';
import { errorHandler } from './http/errorHandler';
import { limiterOn } from './http/limiter';
import { noStore } from './http/noStore';
import { notFound } from './http/refused';
import { securityHeaders } from './http/securityHeaders';
import type { Services } from './services';

/** Ordinary requests are small; panel uploads and entries read their bodies with limits of their own. */
const ordinaryBody = '256kb';

export function createApp(services: Services): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', services.config.trustProxy);
  app.use(securityHeaders);
  app.use(compression());
  app.use('/api', noStore);
  app.use('/api', healthRoutes(readiness(services.database)));
  app.use('/api', contractRoutes());
  app.use(staticClient());
  app.use('/api', services.session.handlers);
  app.use('/api', crossSite);
  app.use('/api', panelsRoutes(services.panels, services.revisions));
  app.use('/api', jobsRoutes(services.jobs, services.boards));
  app.use('/api', entriesRoutes(services.entries));
  app.use('/api', recordsRoutes(services.records, services.verifying));
  app.use('/api', express.json({ limit: ordinaryBody, strict: true }));
  app.use('/api', sessionRoutes(limiterOn(services.database), services.session.passport, services.sessions));
  app.use('/api', peopleRoutes(services.people));
  app.use('/api', sitesRoutes(services.sites));
  app.use('/api', devicesRoutes(services.devices));
  app.use('/api', () => {
    throw notFound();
  });
  if (services.config.devMailFolder !== null) app.use(devMailRoutes(services.config.devMailFolder));
  app.use(clientShell);
  app.use(() => {
    throw notFound();
  });
  app.use(errorHandler(services.log));
  return app;
}
