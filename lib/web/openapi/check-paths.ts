import type { OpenAPIRegistry } from '@asteasolutions/zod-to-openapi';
import { checkReplySchema } from '@/lib/schemas/check-reply';
import { checkRequestSchema } from '@/lib/schemas/check-request';
import { answer, jsonBody, problems, signedIn } from '@/lib/web/openapi/parts';

const description = [
  'Steps a passage leg by leg and answers its state: within limits, little margin (thin), beyond righting moment, or not known (unknown).',
  'Nothing is stored. Names carry their units: kn, M, Deg (true), NewtonM, Nmi. leadingEnd is A with the wind on the port hand of the',
  'direction of travel, B on starboard, both where it changes. largestLoadShare is over the known steps, null where none is known.',
  'Where the wind ends before arrival, that leg and all after it are not known. The caution in the reply goes wherever its figures go.',
].join(' ');

export function registerCheckPaths(registry: OpenAPIRegistry): void {
  registry.registerPath({
    method: 'post',
    path: '/api/check',
    summary: 'Check a passage for a boat and a wind',
    description,
    security: signedIn,
    request: { body: jsonBody(checkRequestSchema) },
    responses: { 200: answer('The passage, leg by leg', checkReplySchema), ...problems(400, 401, 403, 413, 415, 422) },
  });
}
