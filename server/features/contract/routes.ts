import { Router } from 'express';
import { z } from 'zod';
import { panelSchema } from '../../../shared/panel/panelSchema';
import { authorise } from '../../http/authorise';
import { openApiDocument } from './document';

/** What programs need to know before they speak with this server. */
export function contractRoutes(): Router {
  const router = Router();
  let openApi: string | undefined;
  let panel: string | undefined;
  router.get('/openapi.json', authorise({ who: 'anyone' }), (_request, response) => {
    openApi ??= JSON.stringify(openApiDocument());
    response.type('application/json').send(openApi);
  });
  router.get('/schema/panel.json', authorise({ who: 'anyone' }), (_request, response) => {
    panel ??= JSON.stringify(z.toJSONSchema(panelSchema, { target: 'draft-2020-12' }));
    response.type('application/schema+json').send(panel);
  });
  return router;
}
