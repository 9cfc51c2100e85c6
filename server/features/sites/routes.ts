import { Router } from 'express';
import { siteChange, siteRequest } from '../../../shared/api/sites';
import { actorOf, authorise } from '../../http/authorise';
import { parse, parseId } from '../../http/parse';
import type { SitesService } from './service';

export function sitesRoutes(sites: SitesService): Router {
  const router = Router();
  router.get('/sites', authorise({ who: 'signed-in' }), async (request, response) => {
    response.json({ items: await sites.list(actorOf(request)), next: null });
  });
  router.post('/sites', authorise({ roles: ['administrator'] }), async (request, response) => {
    response.status(201).json(await sites.create(actorOf(request), parse(siteRequest, request.body)));
  });
  router.patch('/sites/:id', authorise({ roles: ['administrator'] }), async (request, response) => {
    response.json(
      await sites.change(actorOf(request), parseId(request.params.id), parse(siteChange, request.body)),
    );
  });
  return router;
}
