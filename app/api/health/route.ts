import { health } from '@/lib/web/health';

export const dynamic = 'force-dynamic';

export async function GET(): Promise<Response> {
  const found = await health();
  const status = found.status === 'ok' ? 200 : 503;
  return Response.json(found, { status, headers: { 'cache-control': 'no-store' } });
}
