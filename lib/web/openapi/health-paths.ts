import type { OpenAPIRegistry } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { answer } from '@/lib/web/openapi/parts';

/** Routes about this server itself; anybody may call them. */
export function registerHealthPaths(registry: OpenAPIRegistry): void {
  registry.registerPath({
    method: 'get',
    path: '/api/health',
    summary: 'Whether the server and its database are well',
    security: [],
    responses: {
      200: answer('Well', z.object({ status: z.literal('ok'), database: z.literal('ok') })),
      503: answer('Not well', z.object({ status: z.literal('failing'), database: z.literal('down') })),
    },
  });
  registry.registerPath({
    method: 'get',
    path: '/api/openapi.json',
    summary: 'This document',
    security: [],
    responses: { 200: answer('An OpenAPI 3.1 document', z.looseObject({ openapi: z.string() })) },
  });
}
