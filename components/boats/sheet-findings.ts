import type { BoatFigures } from './boat-figures';
import { figure, limitKn } from './show';

export interface SheetFinding {
  readonly severity: 'danger' | 'caution' | 'plain';
  readonly title: string;
  readonly text: string;
}

/** What the owner should know of the sheet before trusting it, gravest first. Empty is clean. */
export function sheetFindings(figures: BoatFigures): readonly SheetFinding[] {
  return [...abackFindings(figures), ...carryFindings(figures), ...ruleFindings(figures), ...measureFindings(figures)];
}

function abackFindings({ abackRightingNm, sheet }: BoatFigures): SheetFinding[] {
  if (abackRightingNm === null || abackRightingNm > 0) return [];
  return [
    {
      severity: 'danger',
      title: 'She has no reserve aback',
      text: `With the wind on the wrong side the ama’s ${figure(sheet.ama?.volumeL ?? 0)} litres do not carry what the masses press on it: any wind aback takes her over. Check volume and masses, or move weight toward the vaka.`,
    },
  ];
}

function carryFindings({ reefs, sheet }: BoatFigures): SheetFinding[] {
  return reefs
    .filter(({ carriedTooFar }) => carriedTooFar)
    .map(({ reef, holds }) => {
      const mean = reef.carryUpToMeanKn === undefined ? '' : `${figure(reef.carryUpToMeanKn, 1)} kn mean`;
      const gust = reef.carryUpToGustKn === undefined ? '' : `${figure(reef.carryUpToGustKn, 1)} kn gust`;
      return {
        severity: 'caution',
        title: `“${reef.name}”: carry up to is over holds up to`,
        text: `You carry it up to ${[mean, gust].filter(Boolean).join(' and ')}; with your margin it holds up to ${limitKn(holds.worstKn)} mean (${limitKn(holds.worstKn * sheet.gustFactor)} gust) at its worst angle, ${figure(holds.worstAngleDeg)}°. Reef calls keep to the lower of the two. Check masses, areas and heights, or lower what you carry.`,
      };
    });
}

function ruleFindings({ sheet }: BoatFigures): SheetFinding[] {
  if (!('kgPerM2' in sheet.pressure) || sheet.gustFactor <= 1) return [];
  return [
    {
      severity: 'caution',
      title: 'The pressure rule may hold gusts already',
      text: `A rule such as ${figure(sheet.pressure.kgPerM2, 1)} kg/m² at ${figure(sheet.pressure.atKn, 1)} kn is often one that allows for gusts. A gust factor of ${figure(sheet.gustFactor, 2)} comes on top, so that reefs are called early. If the rule holds gusts, set the gust factor to 1.`,
    },
  ];
}

function measureFindings({ sheet, prepared }: BoatFigures): SheetFinding[] {
  const missing = missingMeasures(sheet);
  if (prepared.curve || missing.length === 0) return [];
  return [
    {
      severity: 'plain',
      title: 'Her righting curve is not known',
      text: `Heel, lift-off and touchdown cannot be worked; the state rests on the load share alone. Measure ${missing.join(' and ')}.`,
    },
  ];
}

/** What the curve still needs. */
export function missingMeasures({ vaka, ama }: BoatFigures['sheet']): string[] {
  const missing: string[] = [];
  if (!vaka) missing.push('the vaka’s waterline length and beam');
  if (ama?.waterplaneM2 === undefined) missing.push('the ama’s waterplane area');
  return missing;
}
