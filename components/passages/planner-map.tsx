'use client';

import dynamic from 'next/dynamic';
import { useMemo, useSyncExternalStore } from 'react';
import { stripModel } from '@/components/charts/passage-strip-model';
import { mergeReefCalls } from '@/lib/reef-calls/merge-reef-calls';
import type { CheckResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { formatInZone } from '@/lib/time/format-in-zone';
import type { FocusStore } from './focus-store';
import { useTheme } from './use-theme';

const PassageMap = dynamic(() => import('@/components/map/passage-map').then((module) => module.PassageMap), {
  ssr: false,
  loading: () => <p className="text-muted flex h-full items-center justify-center">The map is being loaded…</p>,
});

interface PlannerMapProps {
  readonly waypoints: readonly {
    readonly id: string;
    readonly name: string;
    readonly lat: number;
    readonly lon: number;
  }[];
  /** Room to each side of the leg that ends at waypoint i + 1, m; where it does not read yet, none is drawn. */
  readonly corridors: readonly number[];
  readonly selectedWaypoint?: string | null;
  /** Null while there is no current check: then the map shows the waypoints alone. */
  readonly check: { readonly result: CheckResult; readonly plan: PassagePlan; readonly gustFactor: number } | null;
  readonly selectedLeg: number | null;
  readonly focus: FocusStore;
  readonly readOnly?: boolean;
  onAddWaypoint?: (place: { lat: number; lon: number }) => void;
  onMoveWaypoint?: (id: string, place: { lat: number; lon: number }) => void;
  onInsertWaypoint?: (legIndex: number, place: { lat: number; lon: number }) => void;
  onSelectLeg: (index: number) => void;
  onSelectWaypoint?: (id: string) => void;
}

const nothing = () => undefined;

/** The chart in its square-cut panel, with the track, shunts and reef calls of the current check. */
export function PlannerMap({ check, readOnly = false, focus, ...rest }: PlannerMapProps) {
  const theme = useTheme();
  const focusPoint = useSyncExternalStore(focus.subscribe, focus.get, () => null);
  const drawn = useMemo(() => {
    if (!check) return { legs: [], shunts: [], reefCalls: [] };
    const { result, plan, gustFactor } = check;
    return {
      legs: result.legs.map(({ track, state, flags }) => ({ track, state, flags })),
      shunts: stripModel(result, plan, gustFactor).shunts.map(({ lat, lon }) => ({ lat, lon })),
      reefCalls: mergeReefCalls(result.legs).map((call) => ({
        lat: call.lat,
        lon: call.lon,
        label: `${call.reef} ${formatInZone(Date.parse(call.at), plan.zone, 'time')}`,
      })),
    };
  }, [check]);
  return (
    <div className="border-line bg-panel h-[58vh] min-h-80 border lg:h-[560px]" data-testid="planner-map">
      <PassageMap
        waypoints={rest.waypoints}
        legs={drawn.legs}
        shunts={drawn.shunts}
        reefCalls={drawn.reefCalls}
        corridors={rest.corridors}
        selectedWaypoint={rest.selectedWaypoint ?? null}
        selectedLeg={rest.selectedLeg}
        theme={theme}
        readOnly={readOnly}
        onAddWaypoint={rest.onAddWaypoint ?? nothing}
        onMoveWaypoint={rest.onMoveWaypoint ?? nothing}
        onInsertWaypoint={rest.onInsertWaypoint ?? nothing}
        onSelectLeg={rest.onSelectLeg}
        onSelectWaypoint={rest.onSelectWaypoint ?? nothing}
        focusPoint={focusPoint}
      />
    </div>
  );
}
