import { Router } from 'express';
import { deviceRequest, keyRequest } from '../../../shared/api/jobs';
import { actorOf, authorise } from '../../http/authorise';
import { parse, parseId } from '../../http/parse';
import type { DevicesService } from './service';

export function devicesRoutes(devices: DevicesService): Router {
  const router = Router();
  router.get('/devices', authorise({ roles: ['administrator'] }), async (request, response) => {
    response.json({ items: await devices.list(actorOf(request)), next: null });
  });
  router.post('/devices', authorise({ who: 'signed-in' }), async (request, response) => {
    response.status(201).json(await devices.register(actorOf(request), parse(deviceRequest, request.body)));
  });
  router.post('/devices/keys', authorise({ who: 'signed-in' }), async (request, response) => {
    response.status(201).json(await devices.registerKey(actorOf(request), parse(keyRequest, request.body)));
  });
  router.post('/devices/:id/revoke', authorise({ roles: ['administrator'] }), async (request, response) => {
    response.json(await devices.revoke(actorOf(request), parseId(request.params.id)));
  });
  return router;
}
