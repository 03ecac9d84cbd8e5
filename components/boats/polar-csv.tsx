'use client';

import { useState, type ChangeEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextArea } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import type { Polar } from '@/lib/polars/polar';
import type { PolarFinding } from '@/lib/polars/polar-finding';
import { readPolarCsv } from '@/lib/polars/read-polar-csv';

/** A polar of 60 winds and 181 angles is far under it. */
const MOST_BYTES = 1_000_000;

interface PolarCsvProps {
  onPolar(polar: Polar): void;
}

/** Takes a polar as pasted text or as a file; what is wrong is listed by line, and nothing is taken over then. */
export function PolarCsv({ onPolar }: PolarCsvProps) {
  const [text, setText] = useState('');
  const [findings, setFindings] = useState<readonly PolarFinding[]>([]);
  const [taken, setTaken] = useState<string | null>(null);

  const take = (csv: string) => {
    const reading = readPolarCsv(csv);
    if ('findings' in reading) {
      setTaken(null);
      setFindings(reading.findings);
      return;
    }
    setFindings([]);
    const { windSpeedsKn, windAnglesDeg } = reading.polar;
    setTaken(`Taken over: ${windSpeedsKn.length} wind speeds by ${windAnglesDeg.length} wind angles. Not saved yet.`);
    onPolar(reading.polar);
  };
  const takeFile = async (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    event.target.value = '';
    if (!file) return;
    if (file.size > MOST_BYTES) {
      setTaken(null);
      setFindings([
        { line: 1, message: `“${file.name}” is over 1 MB: this is no polar. Give a CSV file in long form.` },
      ]);
      return;
    }
    const content = await file.text();
    // What is no text is not put into the field: it could not be mended there.
    if (!content.includes('\u0000')) setText(content);
    take(content);
  };
  return (
    <div className="space-y-3">
      <TextArea
        label="Polar as CSV"
        rows={7}
        spellCheck={false}
        value={text}
        onChange={(event) => setText(event.target.value)}
        placeholder={'true_wind_speed_kn,true_wind_angle_deg,boat_speed_kn\n6,60,2.9\n6,90,3.8'}
        hint="Long form: a header, then one line for each wind speed and wind angle, with commas between and a point as decimal sign."
      />
      <div className="flex flex-wrap items-center gap-3">
        <Button variant="plain" onClick={() => take(text)}>
          Take over the pasted polar
        </Button>
        <label className="border-line hover:border-spruce focus-within:outline-spruce bg-panel inline-flex min-h-11 cursor-pointer items-center border px-4 font-bold focus-within:outline-2 focus-within:outline-offset-2">
          Take it from a file
          <input
            type="file"
            accept=".csv,text/csv,text/plain"
            className="sr-only"
            onChange={(event) => void takeFile(event)}
          />
        </label>
      </div>
      {taken && (
        <Notice tone="good" live>
          {taken}
        </Notice>
      )}
      {findings.length > 0 && (
        <Notice tone="danger" title="Not taken over; the table below is as it was" live>
          <ul className="list-disc space-y-1 pl-5" data-testid="polar-findings">
            {findings.map(({ line, message }, index) => (
              <li key={index}>{/^Line \d/.test(message) ? message : `Line ${line}: ${message}`}</li>
            ))}
          </ul>
        </Notice>
      )}
    </div>
  );
}
