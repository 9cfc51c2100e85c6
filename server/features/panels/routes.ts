import express, { Router } from 'express';
import { z } from 'zod';
import {
  draftSave,
  panelCheckRequest,
  panelQuery,
  panelUpload,
  revisionIssue,
} from '../../../shared/api/panels';
import { maxPanelBytes } from '../../../shared/panel/panelSchema';
import { actorOf, authorise } from '../../http/authorise';
import { limitInFlight } from '../../http/inFlight';
import { languageOf } from '../../http/language';
import { parse, parseId } from '../../http/parse';
import { notFound } from '../../http/refused';
import { checkFile } from './checkFile';
import { panelEditors, panelReaders } from './roles';
import type { RevisionsService } from './revisions';
import type { PanelsService } from './service';

/** A panel file of the greatest size, and the little that stands around it. */
const panelBody = express.json({ limit: maxPanelBytes + 64 * 1024, strict: true });
// A few files of 40 MB fill a small server's memory.
const fewAtOnce = limitInFlight(8, 5);

const revisionNumber = z.coerce.number().int().positive().max(2_147_483_647);
function numberOf(value: unknown): number {
  const parsed = revisionNumber.safeParse(value);
  if (!parsed.success) throw notFound();
  return parsed.data;
}

export function panelsRoutes(panels: PanelsService, revisions: RevisionsService): Router {
  const router = Router();
  const readers = () => authorise({ roles: panelReaders });
  const editors = () => authorise({ roles: panelEditors });

  router.get('/panels', readers(), async (request, response) => {
    response.json(await panels.list(actorOf(request), parse(panelQuery, request.query)));
  });
  router.post('/panels', editors(), fewAtOnce, panelBody, async (request, response) => {
    response.status(201).json(await panels.upload(actorOf(request), parse(panelUpload, request.body)));
  });
  router.get('/panels/:id', readers(), async (request, response) => {
    response.json(await panels.view(actorOf(request), parseId(request.params.id)));
  });
  router.put('/panels/:id/draft', editors(), fewAtOnce, panelBody, async (request, response) => {
    const id = parseId(request.params.id);
    response.json(await panels.saveDraft(actorOf(request), id, parse(draftSave, request.body)));
  });
  router.get('/panels/:id/draft/findings', readers(), async (request, response) => {
    const id = parseId(request.params.id);
    response.json(await panels.draftFindings(actorOf(request), id, languageOf(request)));
  });
  router.post('/panels/:id/revisions', editors(), panelBody, async (request, response) => {
    const id = parseId(request.params.id);
    response
      .status(201)
      .json(await revisions.issue(actorOf(request), id, parse(revisionIssue, request.body)));
  });
  router.get('/panels/:id/revisions/:number', readers(), async (request, response) => {
    const id = parseId(request.params.id);
    response.json(await revisions.view(actorOf(request), id, numberOf(request.params.number)));
  });
  router.get('/panels/:id/revisions/:number/findings', readers(), async (request, response) => {
    const [id, number] = [parseId(request.params.id), numberOf(request.params.number)];
    response.json(await revisions.findings(actorOf(request), id, number, languageOf(request)));
  });
  router.post('/panel-checks', authorise({ who: 'signed-in' }), fewAtOnce, panelBody, (request, response) => {
    response.json(checkFile(parse(panelCheckRequest, request.body)));
  });
  return router;
}
