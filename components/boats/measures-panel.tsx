import { Panel } from '@/components/ui/panel';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { FactList, type Fact } from './fact-list';
import { NotKnown } from './not-known';
import { figure } from './show';

/** Her measures; what was not measured says so, and what it would be needed for. */
export function MeasuresPanel({ sheet }: { readonly sheet: BoatSheet }) {
  const { vaka, ama, pod, spanM } = sheet;
  const facts: Fact[] = [{ what: 'Span, vaka to ama', value: `${figure(spanM, 2)} m` }];
  if (vaka) {
    facts.push(
      { what: 'Vaka, waterline length', value: `${figure(vaka.waterplaneLengthM, 2)} m` },
      { what: 'Vaka, waterline beam', value: `${figure(vaka.waterplaneBeamM, 2)} m` },
      {
        what: 'Vaka, waterplane area',
        value:
          vaka.waterplaneAreaM2 === undefined
            ? `${figure(0.7 * vaka.waterplaneLengthM * vaka.waterplaneBeamM, 2)} m², by default 0.7 · L · b`
            : `${figure(vaka.waterplaneAreaM2, 2)} m²`,
      },
      { what: 'Vaka, centre of buoyancy', value: `${figure(vaka.buoyancyHeightM, 2)} m` },
    );
  } else facts.push({ what: 'Vaka', value: <NotKnown>measure waterline length and beam: for the curve</NotKnown> });
  facts.push(
    {
      what: 'Ama, whole volume',
      value:
        ama?.volumeL === undefined ? (
          <NotKnown>measure it: for the reserve aback</NotKnown>
        ) : (
          `${figure(ama.volumeL)} litres`
        ),
    },
    {
      what: 'Ama, waterplane at rest',
      value:
        ama?.waterplaneM2 === undefined ? (
          <NotKnown>measure it: for lift-off and the curve</NotKnown>
        ) : (
          `${figure(ama.waterplaneM2, 2)} m²`
        ),
    },
  );
  if (pod) {
    facts.push(
      {
        what: 'Lee pod, length × breadth × depth',
        value: `${figure(pod.lengthM, 2)} × ${figure(pod.breadthM, 2)} × ${figure(pod.depthM, 2)} m`,
      },
      { what: 'Lee pod, to leeward of the centreline', value: `${figure(pod.offsetM, 2)} m` },
      { what: 'Lee pod, bottom over the waterline', value: `${figure(pod.bottomHeightM, 2)} m` },
    );
  } else facts.push({ what: 'Lee pod', value: 'none recorded' });
  return (
    <Panel title="Measures">
      <FactList facts={facts} />
    </Panel>
  );
}
