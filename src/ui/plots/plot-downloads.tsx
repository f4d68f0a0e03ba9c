'use client';

import { useState } from 'react';
import { Button } from '@/src/ui/button';
import type { DrawFigure } from './plot-figure';
import { plotCsv, type PlotTable } from './plot-table';
import { saveText } from './save-file';
import { savePicture } from './save-picture';

type Props = { draw: DrawFigure; table: PlotTable; title: string; fileName: string };

export function PlotDownloads({ draw, table, title, fileName }: Props) {
  const [told, setTold] = useState('');
  const picture = (format: 'svg' | 'png') => {
    setTold(`Preparing ${format.toUpperCase()} ...`);
    savePicture(draw, title, fileName, format).then(
      () => setTold(`${format.toUpperCase()} saved.`),
      () => setTold('The picture could not be made. Try again, or save the CSV.'),
    );
  };
  const csv = () => {
    saveText(plotCsv(table), `${fileName}.csv`, 'text/csv');
    setTold('CSV saved.');
  };
  return (
    <div className="flex flex-wrap items-center gap-1" role="group" aria-label={`Save: ${title}`}>
      <Button variant="quiet" size="small" onClick={() => picture('svg')}>
        SVG
      </Button>
      <Button variant="quiet" size="small" onClick={() => picture('png')}>
        PNG
      </Button>
      <Button variant="quiet" size="small" onClick={csv}>
        CSV
      </Button>
      <span className="text-muted text-sm" role="status">
        {told}
      </span>
    </div>
  );
}
