'use client';

import { isBlank } from './is-blank';
import type { Planner } from './use-planner';
import { Verdict, VerdictFrame } from './verdict';

/** The verdict of what is typed just now. Without a current check it is "not known", whatever was shown before. */
export function PlannerVerdict({
  planner,
  reefNames,
}: {
  readonly planner: Planner;
  readonly reefNames: readonly string[];
}) {
  const { check, form } = planner;
  const { plan, problems, missing } = form.reading;
  if (check.status === 'current' && plan) return <Verdict result={check.result} plan={plan} reefNames={reefNames} />;
  if (check.status === 'checking') {
    return (
      <VerdictFrame state="unknown" headline="Not known: checking…">
        <p role="status">The check of this change is under way.</p>
      </VerdictFrame>
    );
  }
  if (check.status === 'failed') {
    return (
      <VerdictFrame state="unknown" headline="Not known: the check did not work">
        <p>{check.message} Saving still works: the server then makes its own check.</p>
      </VerdictFrame>
    );
  }
  const wrong = [...problems.keys()].filter((pointer) => !missing.has(pointer)).length;
  const wanting = isBlank(form.draft)
    ? 'Put in the track, the departure and the wind: then the check begins by itself.'
    : [
        wrong > 0 ? `${wrong === 1 ? 'One field' : `${wrong} fields`} to mend, each with its message.` : null,
        missingWords(missing),
      ]
        .filter(Boolean)
        .join(' ');
  return (
    <VerdictFrame state="unknown" headline="Not known: the plan is not complete">
      <p>{wanting}</p>
    </VerdictFrame>
  );
}

function missingWords(missing: ReadonlySet<string>): string | null {
  const parts = [
    missing.has('/route') ? 'at least two waypoints' : null,
    missing.has('/departure') ? 'the departure' : null,
    missing.has('/wind/rows') ? 'the wind' : null,
    missing.has('/wind/source') ? 'the source of the wind' : null,
    missing.has('/wind/issuedAt') ? 'when the forecast was issued' : null,
  ].filter((part) => part !== null);
  const cells = [...missing].filter((pointer) => /\/\d+\//.test(pointer) || pointer === '/name').length;
  if (cells > 0) parts.push(cells === 1 ? 'one empty field' : `${cells} empty fields`);
  return parts.length === 0 ? null : `Still wanted: ${parts.join(', ')}.`;
}
