import type { OpenAPIRegistry } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { boatRoles } from '@/lib/access/permissions';
import { boatRenameSchema, newBoatSchema, newBoatSheetSchema } from '@/lib/schemas/boat-requests';
import { boatSheetSchema } from '@/lib/schemas/boat-sheet';
import { answer, jsonBody, problems, signedIn } from '@/lib/web/openapi/parts';

export const role = z.enum(boatRoles);
const instant = z.iso.datetime();
const boatLine = z.object({
  id: z.uuid(),
  name: z.string(),
  role,
  sheetNumber: z.number().int(),
  sheetSavedAt: instant,
  hiddenAt: instant.nullable(),
});
const versionLine = z.object({ number: z.number().int(), savedAt: instant, savedBy: z.string() });
const openedBoat = z.object({
  id: z.uuid(),
  name: z.string(),
  role,
  members: z.array(z.object({ name: z.string(), role })),
  version: versionLine.extend({ id: z.uuid(), sheet: boatSheetSchema }),
  newestNumber: z.number().int(),
});

/** Boats and the versions of their sheets. */
export function registerBoatPaths(registry: OpenAPIRegistry): void {
  const params = z.object({ boatId: z.uuid() });
  const common = { security: signedIn, tags: ['boats'] };
  const ofBoat = { ...common, path: '/api/boats/{boatId}' };
  registry.registerPath({
    ...common,
    method: 'get',
    path: '/api/boats',
    summary: 'The boats you have a role on; hidden ones can be brought back for 30 days',
    responses: {
      200: answer('Boats, by name', z.object({ boats: z.array(boatLine), hidden: z.array(boatLine) })),
      ...problems(401),
    },
  });
  registry.registerPath({
    ...common,
    method: 'post',
    path: '/api/boats',
    summary: 'Make a boat, with the first version of her sheet; you become her owner',
    request: { body: jsonBody(newBoatSchema) },
    responses: { 201: answer('Made', z.object({ id: z.uuid() })), ...problems(400, 401, 403, 413, 415, 422) },
  });
  registry.registerPath({
    ...ofBoat,
    method: 'get',
    summary: 'A boat with the newest version of her sheet',
    request: { params },
    responses: { 200: answer('The boat', openedBoat), ...problems(401, 404) },
  });
  registry.registerPath({
    ...ofBoat,
    method: 'patch',
    summary: 'Rename a boat',
    request: { params, body: jsonBody(boatRenameSchema) },
    responses: { 204: { description: 'Renamed' }, ...problems(400, 401, 403, 404, 413, 415) },
  });
  registry.registerPath({
    ...ofBoat,
    method: 'delete',
    summary: 'Hide a boat; can be undone for 30 days',
    request: { params },
    responses: { 204: { description: 'Hidden' }, ...problems(401, 403, 404) },
  });
  registerSheetPaths(registry, { ...common, path: '/api/boats/{boatId}/sheets' }, params);
}

function registerSheetPaths(
  registry: OpenAPIRegistry,
  common: { path: string; security: typeof signedIn; tags: string[] },
  params: z.ZodObject<{ boatId: z.ZodUUID }>,
): void {
  registry.registerPath({
    ...common,
    method: 'get',
    summary: 'The versions of a boat sheet, newest first',
    request: { params },
    responses: { 200: answer('Versions', z.object({ sheets: z.array(versionLine) })), ...problems(401, 404) },
  });
  registry.registerPath({
    ...common,
    method: 'post',
    summary: 'Save a new version of a boat sheet',
    request: { params, body: jsonBody(newBoatSheetSchema) },
    responses: {
      201: answer('Saved', z.object({ number: z.number().int() })),
      ...problems(400, 401, 403, 404, 409, 413, 415, 422),
    },
  });
}
