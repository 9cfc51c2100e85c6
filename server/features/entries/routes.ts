import express, { Router } from 'express';
import { z } from 'zod';
import { entriesRequest } from '../../../shared/api/jobs';
import { actorOf, authorise } from '../../http/authorise';
import { limitInFlight } from '../../http/inFlight';
import { parse, parseId } from '../../http/parse';
import type { EntriesService } from './service';

/** sync.md: 1 MB at most, gzipped or plain. */
const entriesBody = express.json({ limit: '1mb', strict: true });
/** Twice what the database's pool works on: more would only wait. */
const pushesAtOnce = limitInFlight(40, 2);
const pullQuery = z.object({ after: z.coerce.number().int().min(0).max(2_147_483_647).default(0) });

export function entriesRoutes(entries: EntriesService): Router {
  const router = Router();
  // Delivery needs no session: a device that was signed out may still deliver what its people signed.
  router.post(
    '/jobs/:id/entries',
    authorise({ who: 'anyone' }),
    pushesAtOnce,
    entriesBody,
    async (request, response) => {
      const job = parseId(request.params.id);
      response.json(await entries.push(job, parse(entriesRequest, request.body)));
    },
  );
  router.get('/jobs/:id/entries', authorise({ who: 'signed-in' }), async (request, response) => {
    const { after } = parse(pullQuery, request.query);
    response.json(await entries.pull(actorOf(request), parseId(request.params.id), after));
  });
  return router;
}
