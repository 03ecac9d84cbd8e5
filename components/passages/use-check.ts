'use client';

import { useEffect, useRef, useState } from 'react';
import { createCheckClient, type CheckClient } from '@/lib/client/check-client';
import type { CheckResult } from '@/lib/passages/passage';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PassagePlan } from '@/lib/schemas/passage-plan';

/**
 * `result` is of `plan` only while `status` is "current". "checking" may carry the result of the plan before, to be
 * shown as outdated and never as the verdict.
 */
export type CheckView =
  | { readonly status: 'invalid' }
  | { readonly status: 'checking'; readonly before: CheckResult | null }
  | { readonly status: 'current'; readonly result: CheckResult }
  | { readonly status: 'failed'; readonly message: string };

/** Typing pauses this long before the check starts, ms. */
const PAUSE_MS = 120;
/** A page left open: the forecast grows old while nobody types, so the check is asked again, ms. */
const AGAIN_MS = 5 * 60_000;

interface Answered {
  readonly plan: PassagePlan;
  readonly outcome: { readonly result: CheckResult } | { readonly message: string };
}

/** Checks the plan in a worker on every change. */
export function useCheck(plan: PassagePlan | null, sheet: BoatSheet | null): CheckView {
  const [answered, setAnswered] = useState<Answered | null>(null);
  const client = useRef<CheckClient | null>(null);
  const asked = useRef<PassagePlan | null>(null);

  useEffect(() => {
    const worker = new Worker(new URL('../../lib/client/check-worker.ts', import.meta.url), { type: 'module' });
    client.current = createCheckClient(worker, (answer) => {
      if (!asked.current) return;
      setAnswered({
        plan: asked.current,
        outcome: answer.ok ? { result: answer.result } : { message: answer.message },
      });
    });
    return () => {
      client.current?.close();
      client.current = null;
    };
  }, []);

  useEffect(() => {
    client.current?.forget();
    asked.current = plan;
    if (!plan || !sheet) return;
    const ask = () => client.current?.ask({ plan, sheet, asOf: Date.now() });
    const pause = setTimeout(ask, PAUSE_MS);
    const again = setInterval(ask, AGAIN_MS);
    return () => {
      clearTimeout(pause);
      clearInterval(again);
    };
  }, [plan, sheet]);

  if (!plan || !sheet) return { status: 'invalid' };
  if (answered?.plan !== plan) {
    const before = answered && 'result' in answered.outcome ? answered.outcome.result : null;
    return { status: 'checking', before };
  }
  return 'result' in answered.outcome
    ? { status: 'current', result: answered.outcome.result }
    : { status: 'failed', message: answered.outcome.message };
}
