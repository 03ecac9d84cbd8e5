import type { OpenAPIRegistry } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { boatSheetSchema } from '@/lib/schemas/boat-sheet';
import { checkReplySchema } from '@/lib/schemas/check-reply';
import { passagePlanSchema } from '@/lib/schemas/passage-plan';
import { newPassageSchema, passageSaveSchema } from '@/lib/schemas/passage-requests';
import { role } from '@/lib/web/openapi/boat-paths';
import { answer, jsonBody, problems, signedIn } from '@/lib/web/openapi/parts';

const instant = z.iso.datetime();
const state = checkReplySchema.shape.state;
const revision = z.number().int();

const passageLine = z.object({
  id: z.uuid(),
  name: z.string(),
  boatId: z.uuid(),
  boatName: z.string(),
  role,
  zone: z.string(),
  departure: instant,
  updatedAt: instant,
  hiddenAt: instant.nullable(),
  state: state.nullable(),
  largestLoadShare: z.number().nullable(),
  worstLeg: z.object({ position: z.number().int(), from: z.string(), to: z.string() }).nullable(),
});

const checkLine = z.object({
  id: z.uuid(),
  passageRevision: revision,
  sheetNumber: z.number().int(),
  engineVersion: z.string(),
  asOf: instant,
  state,
  largestLoadShare: z.number().nullable(),
  worstLegPosition: z.number().int().nullable(),
  checkedAt: instant,
  checkedBy: z.string(),
});
const check = checkLine.extend({ result: checkReplySchema });

const openedPassage = z.object({
  passage: passagePlanSchema
    .extend({ id: z.uuid(), boatId: z.uuid(), revision })
    .meta({ description: 'The plan; while it is new, its route and wind may be empty' }),
  latestCheck: check.nullable(),
  boat: z.object({ id: z.uuid(), name: z.string(), sheetNumber: z.number().int(), sheet: boatSheetSchema }),
  role,
  sheetIsNewer: z.boolean().meta({ description: 'The check was made with an older version of the boat sheet' }),
});

/** Passages and their stored checks. */
export function registerPassagePaths(registry: OpenAPIRegistry): void {
  const params = z.object({ passageId: z.uuid() });
  const common = { security: signedIn, tags: ['passages'] };
  const ofPassage = { ...common, path: '/api/passages/{passageId}' };
  const lists = z.object({ passages: z.array(passageLine), hidden: z.array(passageLine) });
  registry.registerPath({
    ...common,
    method: 'get',
    path: '/api/passages',
    summary: 'The passages of your boats; hidden ones can be brought back for 30 days',
    request: { query: z.object({ boatId: z.uuid().optional() }) },
    responses: { 200: answer('Passages', lists), ...problems(401) },
  });
  registry.registerPath({
    ...common,
    method: 'post',
    path: '/api/passages',
    summary: 'Make an empty passage of a boat',
    request: { body: jsonBody(newPassageSchema) },
    responses: { 201: answer('Made', z.object({ id: z.uuid() })), ...problems(400, 401, 403, 404, 413, 415) },
  });
  registry.registerPath({
    ...ofPassage,
    method: 'get',
    summary: 'A passage, its newest stored check, and its boat with the newest sheet',
    request: { params },
    responses: { 200: answer('The passage', openedPassage), ...problems(401, 404) },
  });
  registry.registerPath({
    ...ofPassage,
    method: 'put',
    summary: 'Save a plan as a new revision, check it and store the check',
    request: { params, body: jsonBody(passageSaveSchema) },
    responses: {
      200: answer('Saved and checked', z.object({ revision, check })),
      ...problems(400, 401, 403, 404, 409, 413, 415, 422),
    },
  });
  registry.registerPath({
    ...ofPassage,
    method: 'delete',
    summary: 'Hide a passage; can be undone for 30 days',
    request: { params },
    responses: { 204: { description: 'Hidden' }, ...problems(401, 403, 404) },
  });
  registry.registerPath({
    ...common,
    method: 'get',
    path: '/api/passages/{passageId}/checks',
    summary: 'The stored checks of a passage, newest first, without their legs',
    request: { params },
    responses: { 200: answer('Checks', z.object({ checks: z.array(checkLine) })), ...problems(401, 404) },
  });
  registry.registerPath({
    ...common,
    method: 'get',
    path: '/api/sample-forecast',
    summary: "The demo's invented wind for today; only where the demo is on",
    responses: { 200: answer('Wind, as a plan holds it', passagePlanSchema.shape.wind), ...problems(401, 404) },
  });
}
