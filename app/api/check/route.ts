import { checkRequestSchema } from '@/lib/schemas/check-request';
import { computeCheck } from '@/lib/usecases/checks/compute-check';
import { landForChecks } from '@/lib/web/land';
import { route } from '@/lib/web/route';

export const POST = route({ auth: 'user', body: checkRequestSchema }, async ({ body }) =>
  computeCheck(body, { now: new Date(), land: await landForChecks() }),
);
