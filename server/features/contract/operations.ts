/** What each route takes and answers, for the published description of the API. */
import { z } from 'zod';
import { page, pageQuery } from '../../../shared/api/common';
import {
  cancelRequest,
  deviceRequest,
  deviceView,
  entriesAnswer,
  entriesPage,
  entriesRequest,
  jobPreview,
  jobPreviewRequest,
  jobQuery,
  jobRequest,
  jobsPage,
  jobStateView,
  jobView,
  keyRequest,
  packList,
} from '../../../shared/api/jobs';
import {
  draftSave,
  findingsAnswer,
  panelCheck,
  panelCheckRequest,
  panelQuery,
  panelRow,
  panelsPage,
  panelUpload,
  panelView,
  revisionIssue,
  revisionRow,
  revisionView,
} from '../../../shared/api/panels';
import {
  invitationLook,
  invitationRequest,
  passwordResetRequest,
  passwordWithToken,
  personChange,
  personView,
  sessionView,
  signInRequest,
  tokenRequest,
} from '../../../shared/api/people';
import { recordView } from '../../../shared/api/recordDocument';
import { recordQuery, recordRow, verifyAnswer, verifyRequest } from '../../../shared/api/records';
import { siteChange, siteRequest, siteView } from '../../../shared/api/sites';

export interface Operation {
  query?: z.ZodType;
  body?: z.ZodType;
  /** Absent: a file, or nothing. */
  answer?: z.ZodType;
  /** Of success; 200 when absent. */
  status?: 200 | 201 | 202 | 204;
}

const idOnly = z.object({ id: z.uuid() });
const after = z.object({ after: z.int().min(0).optional() });

/** By method and path, as the router has them. */
export const operations: Readonly<Record<string, Operation>> = {
  'get /api/health/live': { answer: z.object({ live: z.boolean() }) },
  'get /api/health/ready': { answer: z.object({ ready: z.boolean() }) },
  'get /api/openapi.json': { answer: z.unknown() },
  'get /api/schema/panel.json': { answer: z.unknown() },
  'post /api/session': { body: signInRequest, answer: sessionView },
  'get /api/session': { answer: sessionView },
  'delete /api/session': { status: 204 },
  'get /api/people': { query: pageQuery, answer: page(personView) },
  'patch /api/people/:id': { body: personChange, answer: personView },
  'post /api/invitations': { body: invitationRequest, answer: personView, status: 201 },
  'post /api/invitations/look': { body: tokenRequest, answer: invitationLook },
  'post /api/invitations/accept': { body: passwordWithToken, answer: z.object({ email: z.string() }) },
  'post /api/password-resets': { body: passwordResetRequest, answer: z.object({}), status: 202 },
  'post /api/password-resets/use': { body: passwordWithToken, answer: z.object({ email: z.string() }) },
  'get /api/sites': { answer: page(siteView) },
  'post /api/sites': { body: siteRequest, answer: siteView, status: 201 },
  'patch /api/sites/:id': { body: siteChange, answer: siteView },
  'get /api/panels': { query: panelQuery, answer: panelsPage },
  'post /api/panels': { body: panelUpload, answer: panelRow, status: 201 },
  'get /api/panels/:id': { answer: panelView },
  'put /api/panels/:id/draft': { body: draftSave, answer: panelRow },
  'get /api/panels/:id/draft/findings': { answer: findingsAnswer },
  'post /api/panels/:id/revisions': { body: revisionIssue, answer: revisionRow, status: 201 },
  'get /api/panels/:id/revisions/:number': { answer: revisionView },
  'get /api/panels/:id/revisions/:number/findings': { answer: findingsAnswer },
  'post /api/panel-checks': { body: panelCheckRequest, answer: panelCheck },
  'get /api/jobs': { query: jobQuery, answer: jobsPage },
  'post /api/jobs/preview': { body: jobPreviewRequest, answer: jobPreview },
  'post /api/jobs': { body: jobRequest, answer: jobView, status: 201 },
  'get /api/jobs/:id': { answer: jobView },
  'get /api/jobs/:id/state': { answer: jobStateView },
  'post /api/jobs/:id/send': { answer: jobView },
  'post /api/jobs/:id/cancel': { body: cancelRequest, answer: jobView },
  'post /api/jobs/:id/entries': { body: entriesRequest, answer: entriesAnswer },
  'get /api/jobs/:id/entries': { query: after, answer: entriesPage },
  'get /api/my/packs': { query: z.object({ have: z.string().optional() }), answer: packList },
  'get /api/devices': { answer: page(deviceView) },
  'post /api/devices': { body: deviceRequest, answer: idOnly, status: 201 },
  'post /api/devices/keys': { body: keyRequest, answer: idOnly, status: 201 },
  'post /api/devices/:id/revoke': { answer: deviceView },
  'get /api/records': { query: recordQuery, answer: page(recordRow) },
  'get /api/records/:id': { answer: recordView },
  'get /api/records/:id.json': {},
  'get /api/records/:id.pdf': {},
  'post /api/verify': { body: verifyRequest, answer: verifyAnswer },
};
