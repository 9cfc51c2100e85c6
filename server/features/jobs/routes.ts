import express, { Router } from 'express';
import { z } from 'zod';
import { digest } from '../../../shared/api/common';
import { cancelRequest, jobPreviewRequest, jobQuery, jobRequest } from '../../../shared/api/jobs';
import { actorOf, authorise } from '../../http/authorise';
import { languageOf } from '../../http/language';
import { parse, parseId } from '../../http/parse';
import type { JobBoards } from './boards';
import { jobMakers } from './roles';
import type { JobsService } from './service';

/** A job may name every point of the greatest panel. */
const jobBody = express.json({ limit: '2mb', strict: true });

const packsQuery = z.object({
  have: z
    .string()
    .max(60_000)
    .default('')
    .transform((value) => value.split(',').filter((each) => each !== ''))
    .pipe(z.array(digest)),
});

export function jobsRoutes(jobs: JobsService, boards: JobBoards): Router {
  const router = Router();
  const makers = () => authorise({ roles: jobMakers });
  const signedIn = () => authorise({ who: 'signed-in' });

  router.get('/jobs', signedIn(), async (request, response) => {
    response.json(await boards.list(actorOf(request), parse(jobQuery, request.query)));
  });
  router.post('/jobs/preview', makers(), jobBody, async (request, response) => {
    const choice = parse(jobPreviewRequest, request.body);
    response.json(await jobs.preview(actorOf(request), choice, languageOf(request)));
  });
  router.post('/jobs', makers(), jobBody, async (request, response) => {
    response.status(201).json(await jobs.create(actorOf(request), parse(jobRequest, request.body)));
  });
  router.get('/jobs/:id', signedIn(), async (request, response) => {
    response.json(await boards.view(actorOf(request), parseId(request.params.id)));
  });
  router.get('/jobs/:id/state', signedIn(), async (request, response) => {
    const id = parseId(request.params.id);
    response.json(await boards.state(actorOf(request), id, languageOf(request)));
  });
  router.post('/jobs/:id/send', makers(), async (request, response) => {
    response.json(await jobs.send(actorOf(request), parseId(request.params.id)));
  });
  router.post('/jobs/:id/cancel', makers(), jobBody, async (request, response) => {
    const id = parseId(request.params.id);
    response.json(await jobs.cancel(actorOf(request), id, parse(cancelRequest, request.body)));
  });
  router.get('/my/packs', signedIn(), async (request, response) => {
    const { have } = parse(packsQuery, request.query);
    response.json(await boards.myPacks(actorOf(request), new Set(have)));
  });
  return router;
}
