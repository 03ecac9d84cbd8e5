import { Beam } from '@/components/charts/beam';
import { StateMark } from '@/components/charts/state-mark';
import type { LegFacts } from './leg-facts';
import { ReefLines } from './reef-lines';

interface LegsTableProps {
  readonly facts: readonly LegFacts[];
  readonly workingMargin: number;
  readonly selectedLeg: number | null;
  onSelectLeg?: ((index: number) => void) | undefined;
}

/** The legs on a wide screen, ruled like a page of the notebook. */
export function LegsTable({ facts, workingMargin, selectedLeg, onSelectLeg }: LegsTableProps) {
  return (
    <table className="hidden w-full border-collapse text-left text-sm tabular-nums lg:table" data-testid="legs-table">
      <caption className="sr-only">Legs of the passage with their loads and states</caption>
      <thead className="border-ink text-muted border-b-2 align-bottom">
        <tr>
          {[
            'Leg',
            'Course and distance',
            'Wind off the course, way',
            'Leading end, shunts',
            'Reef called',
            'Load share',
            'Heeling against righting moment',
            'Time',
            'State',
          ].map((heading) => (
            <th key={heading} scope="col" className="py-2 pr-3 font-normal">
              {heading}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {facts.map((row) => (
          <tr
            key={row.index}
            className={`border-line border-b align-top ${selectedLeg === row.index ? 'bg-spruce/10' : ''}`}
          >
            <th scope="row" className="max-w-52 py-2.5 pr-3 font-bold">
              <button
                type="button"
                className="text-left font-bold underline decoration-dotted underline-offset-4"
                aria-pressed={selectedLeg === row.index}
                onClick={() => onSelectLeg?.(row.index)}
              >
                {row.index + 1} {row.name}
              </button>
            </th>
            <td className="py-2.5 pr-3 whitespace-nowrap">
              {row.course}
              <br />
              {row.distance}
            </td>
            <td className="py-2.5 pr-3">
              {row.wind}
              <br />
              {row.way}
            </td>
            <td className="py-2.5 pr-3">
              {row.end}
              <br />
              {row.shunts}
            </td>
            <td className="py-2.5 pr-3">
              <ReefLines reefs={row.reefs} />
            </td>
            <td className="py-2.5 pr-3">
              <LoadShare row={row} workingMargin={workingMargin} />
            </td>
            <td className="py-2.5 pr-3">
              {row.leg.heelingMomentNewtonM !== null ? (
                <>
                  {row.heeling} against
                  <br />
                  {row.righting}
                </>
              ) : (
                'not known'
              )}
            </td>
            <td className="py-2.5 pr-3 whitespace-nowrap">
              {row.times}
              {row.duration && (
                <>
                  <br />
                  {row.duration}
                </>
              )}
            </td>
            <td className="py-2.5">
              <StateMark state={row.leg.state} withWord />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** Load share with its small beam, and the share beam-on at rest where it counts. What is not known has no beam to show. */
export function LoadShare({ row, workingMargin }: { readonly row: LegFacts; readonly workingMargin: number }) {
  const { leg } = row;
  return (
    <>
      <span className="flex items-center gap-2">
        <span className="font-bold">{row.loadShare}</span>
        {leg.largestLoadShare !== null && leg.state !== 'unknown' && (
          <Beam
            size="small"
            loadShare={leg.largestLoadShare}
            heelingNm={leg.heelingMomentNewtonM ?? 0}
            rightingNm={leg.rightingMomentNewtonM ?? 0}
            workingMargin={workingMargin}
          />
        )}
      </span>
      {row.atRest && <span className="text-muted">at rest {row.atRest}</span>}
    </>
  );
}
