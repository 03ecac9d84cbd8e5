import { Cell, DataTable, HeadCell } from '@/components/ui/data-table';
import { Disclosure } from '@/components/ui/disclosure';
import { Panel } from '@/components/ui/panel';
import { writePolarCsv } from '@/lib/polars/write-polar-csv';
import type { Polar } from '@/lib/polars/polar';
import { figure } from './show';

/** Boat speed by wind speed (down) and wind angle (across). */
export function PolarTable({ polar }: { readonly polar: Polar }) {
  return (
    <Panel title="Polar">
      <p className="text-muted mb-2 text-sm">
        Boat speed through the water in knots with full sail, by true wind speed and true wind angle.
      </p>
      <DataTable caption="Polar: boat speed in knots">
        <thead>
          <tr>
            <HeadCell>Wind</HeadCell>
            {polar.windAnglesDeg.map((deg) => (
              <HeadCell key={deg} className="text-right">
                {figure(deg, 1)}°
              </HeadCell>
            ))}
          </tr>
        </thead>
        <tbody>
          {polar.windSpeedsKn.map((kn, wind) => (
            <tr key={kn}>
              <Cell className="font-bold whitespace-nowrap">{figure(kn, 1)} kn</Cell>
              {polar.speedsKn[wind]?.map((speed, angle) => (
                <Cell key={polar.windAnglesDeg[angle]} className="text-right">
                  {speed.toFixed(1)}
                </Cell>
              ))}
            </tr>
          ))}
        </tbody>
      </DataTable>
      <Disclosure summary="The same as CSV">
        <pre className="overflow-x-auto text-sm" tabIndex={0}>
          {writePolarCsv(polar)}
        </pre>
      </Disclosure>
    </Panel>
  );
}
