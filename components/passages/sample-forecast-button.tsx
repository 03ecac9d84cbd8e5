'use client';

import { useEffect, useState } from 'react';
import { z } from 'zod';
import { isZone } from './plan-from-draft';
import { usePlannerForm } from './planner-context';
import { timeToDraft } from './read-time';
import { SmallButton } from './small-button';

const instant = z.iso.datetime({ offset: true });
const sampleSchema = z.object({
  source: z.string(),
  issuedAt: instant,
  rows: z
    .array(z.object({ time: instant, fromDeg: z.number(), meanKn: z.number(), gustKn: z.number().optional() }))
    .min(1),
});
type Sample = z.output<typeof sampleSchema>;

/** Offers the bundled sample forecast where the server has one; elsewhere there is no button. */
export function SampleForecastButton() {
  const { draft, dispatch } = usePlannerForm();
  const [sample, setSample] = useState<Sample | null>(null);
  useEffect(() => {
    const stop = new AbortController();
    const load = async () => {
      const response = await fetch('/api/sample-forecast', { signal: stop.signal });
      if (!response.ok) return;
      const parsed = sampleSchema.safeParse(await response.json());
      if (parsed.success) setSample(parsed.data);
    };
    load().catch(() => setSample(null));
    return () => stop.abort();
  }, []);
  if (!sample) return null;
  const zone = isZone(draft.zone) ? draft.zone : 'UTC';
  const time = (iso: string) => timeToDraft(Date.parse(iso), zone);
  return (
    <SmallButton
      onClick={() =>
        dispatch({
          type: 'useForecast',
          source: sample.source,
          issued: time(sample.issuedAt),
          rows: sample.rows.map((row) => ({
            time: time(row.time),
            from: String(row.fromDeg),
            mean: String(row.meanKn),
            gust: row.gustKn === undefined ? '' : String(row.gustKn),
          })),
        })
      }
    >
      Use the sample forecast for today
    </SmallButton>
  );
}
