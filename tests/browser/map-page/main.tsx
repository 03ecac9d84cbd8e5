/** The map alone, with a passage that it may change: what it asks for is kept for the test to read. */
import { useState } from 'react';
import { createRoot } from 'react-dom/client';
import { PassageMap } from '@/components/map/passage-map';
import type { MapLeg, MapPlace, MapWaypoint } from '@/components/map/map-types';

declare global {
  interface Window {
    asked: unknown[][];
    setMapTheme: (theme: 'day' | 'night') => void;
  }
}
window.asked = [];

const START: readonly MapWaypoint[] = [
  { id: 'first', name: 'Off Smallpox Bay', lat: 48.54, lon: -123.2 },
  { id: 'second', name: 'Mid strait', lat: 48.44, lon: -123.22 },
  { id: 'third', name: 'South of the islands', lat: 48.4, lon: -122.98 },
];
const time = '2026-07-01T17:00:00.000Z';
const LEGS: readonly MapLeg[] = [
  {
    state: 'thin',
    flags: [{ code: 'little-margin', severity: 'caution', at: time, lat: 48.46, lon: -123.216, numbers: {} }],
    track: [
      [-123.2, 48.54, time, 'A'],
      [-123.25, 48.49, time, 'B'],
      [-123.22, 48.44, time, 'B'],
    ],
  },
  { state: 'unknown', flags: [], track: [] },
];

function Page() {
  const [waypoints, setWaypoints] = useState(START);
  const [selectedLeg, setSelectedLeg] = useState<number | null>(null);
  const [theme, setTheme] = useState<'day' | 'night'>('day');
  window.setMapTheme = setTheme;
  const ask = (what: string, ...rest: unknown[]) => window.asked.push([what, ...rest]);
  return (
    <PassageMap
      waypoints={waypoints}
      legs={LEGS}
      shunts={[{ lat: 48.49, lon: -123.25 }]}
      reefCalls={[{ lat: 48.5, lon: -123.24, label: 'first reef 10:20' }]}
      corridors={[2000, 1000]}
      selectedLeg={selectedLeg}
      theme={theme}
      onAddWaypoint={(place: MapPlace) => {
        ask('add', place);
        setWaypoints((before) => [...before, { id: `added-${before.length}`, name: '', ...place }]);
      }}
      onMoveWaypoint={(id, place) => {
        ask('move', id, place);
        setWaypoints((before) => before.map((waypoint) => (waypoint.id === id ? { ...waypoint, ...place } : waypoint)));
      }}
      onInsertWaypoint={(leg, place) => ask('insert', leg, place)}
      onSelectLeg={(leg) => {
        ask('leg', leg);
        setSelectedLeg(leg);
      }}
      onSelectWaypoint={(id) => ask('waypoint', id)}
    />
  );
}

createRoot(document.getElementById('map')!).render(<Page />);
