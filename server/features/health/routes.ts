import { Router } from 'express';
import { authorise } from '../../http/authorise';
import { Refused } from '../../http/refused';

export function healthRoutes(isReady: () => Promise<boolean>): Router {
  const router = Router();
  router.get('/health/live', authorise({ who: 'anyone' }), (_request, response) => {
    response.json({ live: true });
  });
  router.get('/health/ready', authorise({ who: 'anyone' }), async (_request, response) => {
    if (!(await isReady())) throw new Refused(503, 'not-ready', {}, [], { 'retry-after': '5' });
    response.json({ ready: true });
  });
  return router;
}
