import { Cell, DataTable, HeadCell } from '@/components/ui/data-table';
import { Panel } from '@/components/ui/panel';
import type { BoatFigures } from './boat-figures';
import { figure } from './show';

/** Every mass item with its moments, and the sums under a double rule. */
export function MassesTable({ figures }: { readonly figures: BoatFigures }) {
  const { sheet, sums } = figures;
  return (
    <Panel title="Masses">
      <DataTable caption="Mass items and their moments">
        <thead>
          <tr>
            <HeadCell>Item</HeadCell>
            <HeadCell>Kind</HeadCell>
            <HeadCell className="text-right">kg</HeadCell>
            <HeadCell className="text-right">y, m</HeadCell>
            <HeadCell className="text-right">z, m</HeadCell>
            <HeadCell className="text-right">m·y, kg·m</HeadCell>
          </tr>
        </thead>
        <tbody>
          {sheet.masses.map(({ label, kind, kg, yM, zM }, index) => (
            <tr key={index}>
              <Cell className="min-w-36 break-words">{label}</Cell>
              <Cell className="text-muted">{kind}</Cell>
              <Cell className="text-right">{figure(kg, 1)}</Cell>
              <Cell className="text-right">{figure(yM, 2)}</Cell>
              <Cell className="text-right">{figure(zM, 2)}</Cell>
              <Cell className="text-right">{figure(kg * yM, 1)}</Cell>
            </tr>
          ))}
        </tbody>
        <tfoot className="[&_td]:border-ink font-bold [&_td]:border-t-2 [&_td]:border-b-0">
          <tr>
            <Cell colSpan={2}>Σ</Cell>
            <Cell className="text-right">{figure(sums.massKg, 1)}</Cell>
            <Cell />
            <Cell />
            <Cell className="text-right">{figure(sums.momentYKgM, 1)}</Cell>
          </tr>
        </tfoot>
      </DataTable>
    </Panel>
  );
}
