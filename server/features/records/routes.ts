import express, { Router, type Response } from 'express';
import { recordQuery, verifyRequest } from '../../../shared/api/records';
import { actorOf, authorise } from '../../http/authorise';
import { limitInFlight } from '../../http/inFlight';
import { parse, parseId } from '../../http/parse';
import type { RecordBooks, RecordFile } from './books';
import type { RecordVerifying } from './verifying';

/** A record of 20,000 points is about this large. */
const recordBody = express.json({ limit: '64mb', strict: true });
/** Anybody may ask, and a whole chain is walked each time: past this many at once the next asks again. */
const verifyingAtOnce = limitInFlight(8, 2);

function send(response: Response, type: string, { name, bytes }: RecordFile): void {
  response.type(type).set('content-disposition', `attachment; filename="${name}"`).send(bytes);
}

export function recordsRoutes(books: RecordBooks, verifying: RecordVerifying): Router {
  const router = Router();
  const signedIn = () => authorise({ who: 'signed-in' });

  router.get('/records', signedIn(), async (request, response) => {
    response.json(await books.list(actorOf(request), parse(recordQuery, request.query)));
  });
  router.get('/records/:id.json', signedIn(), async (request, response) => {
    send(response, 'application/json', await books.json(actorOf(request), parseId(request.params.id)));
  });
  router.get('/records/:id.pdf', signedIn(), async (request, response) => {
    send(response, 'application/pdf', await books.pdf(actorOf(request), parseId(request.params.id)));
  });
  router.get('/records/:id', signedIn(), async (request, response) => {
    response.json(await books.view(actorOf(request), parseId(request.params.id)));
  });
  router.post(
    '/verify',
    authorise({ who: 'anyone' }),
    verifyingAtOnce,
    recordBody,
    async (request, response) => {
      response.json(await verifying.verify(parse(verifyRequest, request.body)));
    },
  );
  return router;
}
