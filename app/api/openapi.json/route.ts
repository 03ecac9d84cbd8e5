import { openApiDocument } from '@/lib/web/openapi/document';

export function GET(): Response {
  return Response.json(openApiDocument(), { headers: { 'cache-control': 'no-store' } });
}
