import { Beam } from '@/components/charts/beam';
import { StateMark } from '@/components/charts/state-mark';
import { Cell, DataTable, HeadCell } from '@/components/ui/data-table';
import type { Reef } from '@/lib/rigging/craft';
import type { BenchLoad } from './heeling-bench-load';
import { figure, kgM, newtonM } from './show';

interface HeelingTableProps {
  readonly loads: readonly { readonly reef: Reef; readonly load: BenchLoad }[];
  readonly workingMargin: number;
  /** Without the curve heel is not known; with it, no heel may balance. */
  readonly hasCurve: boolean;
}

/** Each reef in the chosen wind, one line. */
export function HeelingTable({ loads, workingMargin, hasCurve }: HeelingTableProps) {
  return (
    <DataTable caption="Heeling moment of each reef in the chosen wind">
      <thead>
        <tr>
          <HeadCell>Reef</HeadCell>
          <HeadCell>State</HeadCell>
          <HeadCell>Load share</HeadCell>
          <HeadCell className="text-right">Heeling moment</HeadCell>
          <HeadCell className="text-right">Apparent gust</HeadCell>
          <HeadCell className="text-right">Boat speed</HeadCell>
          <HeadCell className="text-right">Heel</HeadCell>
        </tr>
      </thead>
      <tbody>
        {loads.map(({ reef, load }) => (
          <tr key={reef.name}>
            <Cell className="min-w-28 font-bold">{reef.name}</Cell>
            <Cell>
              <StateMark state={load.state} withWord size={20} />
            </Cell>
            <Cell>
              <span className="flex items-center gap-2">
                <span className="font-bold">{load.loadShare.toFixed(2)}</span>
                <Beam {...load} workingMargin={workingMargin} />
              </span>
              {load.atRestShare !== null && (
                <span className="text-muted text-sm">at rest {load.atRestShare.toFixed(2)}</span>
              )}
            </Cell>
            <Cell className="text-right whitespace-nowrap">
              {kgM(load.heelingNm)}
              <span className="text-muted block text-sm">{newtonM(load.heelingNm)}</span>
            </Cell>
            <Cell className="text-right whitespace-nowrap">{figure(load.apparentKn, 1)} kn</Cell>
            <Cell className="text-right whitespace-nowrap">{figure(load.boatKn, 1)} kn</Cell>
            <Cell className="text-right whitespace-nowrap">
              {load.heelDeg === null ? (hasCurve ? 'none balances' : 'not known') : `${figure(load.heelDeg, 1)}°`}
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
