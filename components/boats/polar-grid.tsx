'use client';

import { Button } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import { PolarCell } from './polar-cell';
import type { PolarEdit } from './polar-edits';
import type { PolarForm } from './sheet-form';

interface PolarGridProps {
  readonly polar: PolarForm;
  /** Paths of cells with a message. */
  readonly wrong: ReadonlySet<string>;
  onEdit(edit: PolarEdit): void;
}

/** The polar as a grid: wind speeds down, wind angles across, boat speeds in knots inside. */
export function PolarGrid({ polar, wrong, onEdit }: PolarGridProps) {
  const { windSpeedsKn, windAnglesDeg, speedsKn } = polar;
  const at = (...keys: (string | number)[]) => ['sheet.polar', ...keys].join('.');
  return (
    <>
      <DataTable caption="Polar, to be edited">
        <thead>
          <tr>
            <th scope="col" className="text-muted p-1 text-left text-sm">
              wind, kn ╲ angle, °
            </th>
            {windAnglesDeg.map((text, angle) => (
              <th key={angle} scope="col" className="p-1">
                <PolarCell
                  head
                  path={at('windAnglesDeg', angle)}
                  label={`Wind angle ${angle + 1}, degrees`}
                  value={text}
                  wrong={wrong.has(at('windAnglesDeg', angle))}
                  onText={(next) => onEdit({ kind: 'angle', angle, text: next })}
                />
              </th>
            ))}
            <td />
          </tr>
        </thead>
        <tbody>
          {windSpeedsKn.map((windText, wind) => (
            <tr key={wind}>
              <th scope="row" className="p-1 text-left">
                <PolarCell
                  head
                  path={at('windSpeedsKn', wind)}
                  label={`Wind speed ${wind + 1}, knots`}
                  value={windText}
                  wrong={wrong.has(at('windSpeedsKn', wind))}
                  onText={(text) => onEdit({ kind: 'wind', wind, text })}
                />
              </th>
              {windAnglesDeg.map((angleText, angle) => (
                <td key={angle} className="p-1">
                  <PolarCell
                    path={at('speedsKn', wind, angle)}
                    label={`Boat speed at ${windText || '?'} kn and ${angleText || '?'}°, knots`}
                    value={speedsKn[wind]?.[angle] ?? ''}
                    wrong={wrong.has(at('speedsKn', wind, angle))}
                    onText={(text) => onEdit({ kind: 'speed', wind, angle, text })}
                  />
                </td>
              ))}
              <td className="p-1">
                <TakeOut
                  label={`Take the wind ${windText || wind + 1} kn out`}
                  disabled={windSpeedsKn.length <= 1}
                  onClick={() => onEdit({ kind: 'remove-wind', wind })}
                />
              </td>
            </tr>
          ))}
          <tr>
            <td />
            {windAnglesDeg.map((text, angle) => (
              <td key={angle} className="p-1">
                <TakeOut
                  label={`Take the angle ${text || angle + 1}° out`}
                  disabled={windAnglesDeg.length <= 2}
                  onClick={() => onEdit({ kind: 'remove-angle', angle })}
                />
              </td>
            ))}
          </tr>
        </tbody>
      </DataTable>
      <div className="mt-3 flex flex-wrap gap-3">
        <Button variant="plain" onClick={() => onEdit({ kind: 'add-wind' })}>
          Add a wind speed
        </Button>
        <Button variant="plain" onClick={() => onEdit({ kind: 'add-angle' })}>
          Add a wind angle
        </Button>
      </div>
    </>
  );
}

function TakeOut({ label, ...rest }: { label: string; disabled: boolean; onClick(): void }) {
  return (
    <Button variant="plain" aria-label={label} className="w-16 px-2" {...rest}>
      <svg viewBox="0 0 16 16" aria-hidden="true" className="size-3.5" stroke="currentColor" strokeWidth="2.5">
        <path d="M2 2l12 12M14 2L2 14" />
      </svg>
    </Button>
  );
}
