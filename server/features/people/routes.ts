import { Router } from 'express';
import { z } from 'zod';
import { id, pageQuery, role } from '../../../shared/api/common';
import {
  invitationRequest,
  passwordResetRequest,
  passwordWithToken,
  personChange,
  tokenRequest,
} from '../../../shared/api/people';
import { actorOf, authorise } from '../../http/authorise';
import { parse, parseId } from '../../http/parse';
import type { PeopleService } from './service';

const listQuery = pageQuery.extend({ site: id.optional(), role: role.optional() });
const done = z.object({}).parse({});

export function peopleRoutes(people: PeopleService): Router {
  const router = Router();
  router.get(
    '/people',
    authorise({ roles: ['administrator', 'foreman', 'safety-officer'] }),
    async (request, response) => {
      response.json(await people.list(actorOf(request), parse(listQuery, request.query)));
    },
  );
  router.patch('/people/:id', authorise({ roles: ['administrator'] }), async (request, response) => {
    response.json(
      await people.change(actorOf(request), parseId(request.params.id), parse(personChange, request.body)),
    );
  });
  router.post('/invitations', authorise({ roles: ['administrator'] }), async (request, response) => {
    response.status(201).json(await people.invite(actorOf(request), parse(invitationRequest, request.body)));
  });
  router.post('/invitations/look', authorise({ who: 'anyone' }), async (request, response) => {
    response.json(await people.lookAtInvitation(parse(tokenRequest, request.body).token));
  });
  router.post('/invitations/accept', authorise({ who: 'anyone' }), async (request, response) => {
    const { token, password } = parse(passwordWithToken, request.body);
    response.json(await people.setPassword('invitation', token, password));
  });
  router.post('/password-resets', authorise({ who: 'anyone' }), async (request, response) => {
    await people.askPasswordReset(parse(passwordResetRequest, request.body).email);
    response.status(202).json(done);
  });
  router.post('/password-resets/use', authorise({ who: 'anyone' }), async (request, response) => {
    const { token, password } = parse(passwordWithToken, request.body);
    response.json(await people.setPassword('password-reset', token, password));
  });
  return router;
}
