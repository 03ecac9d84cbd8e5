import { NotFoundError } from '@/lib/errors';
import { sampleForecast } from '@/lib/usecases/demo/sample-forecast';
import { isDemo } from '@/lib/web/demo';
import { route } from '@/lib/web/route';

/** The demo's wind for today. Without the demo there is none. */
export const GET = route({ auth: 'user' }, () => {
  if (!isDemo()) throw new NotFoundError('A sample forecast');
  return sampleForecast(new Date());
});
