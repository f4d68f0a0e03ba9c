import type { MaterialSummary } from '@/entities/run-summary';
import { intervalsInWords } from './run-answer';
import { percentText, trimmed } from './run-figures';
import { RunSection } from './run-section';

const columns = [
  'Material',
  'Grains',
  'Mean density (g/cm³)',
  'Unbound, by number',
  'Unbound radii',
  'Highest beta',
  'at radius (µm)',
  'Blow-out radius if Q_pr = 1 (µm)',
  'Error bound of beta',
];

export function RunMaterials({ materials }: { materials: readonly MaterialSummary[] }) {
  return (
    <RunSection id="materials" title="By material">
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Table of materials">
        <table className="w-full min-w-[56rem] text-sm">
          <caption className="sr-only">Unbound radii and numbers of each material</caption>
          <thead>
            <tr className="text-muted align-bottom">
              {columns.map((column, index) => (
                <th
                  key={column}
                  scope="col"
                  className={`px-2 py-1 font-medium first:pl-0 ${index === 0 || index === 4 ? 'text-left' : 'text-right'}`}
                >
                  {column}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {materials.map((material) => (
              <MaterialRow key={material.material} material={material} />
            ))}
          </tbody>
        </table>
      </div>
    </RunSection>
  );
}

function MaterialRow({ material }: { material: MaterialSummary }) {
  const figure = 'px-2 py-1.5 text-right font-mono tabular-nums';
  return (
    <tr className="border-line border-t">
      <th scope="row" className="py-1.5 pr-2 text-left font-medium">
        {material.name}
      </th>
      <td className={figure}>{material.grains.toLocaleString('en-US')}</td>
      <td className={figure}>{trimmed(material.meanDensityGCm3, 4)}</td>
      <td className={figure}>{percentText(material.unboundNumberShare)}</td>
      <td className="px-2 py-1.5">{intervalsInWords(material.unboundIntervalsUm)}</td>
      <td className={figure}>{trimmed(material.betaMax, 4)}</td>
      <td className={figure}>{trimmed(material.radiusAtBetaMaxUm, 4)}</td>
      <td className={figure}>{trimmed(material.geometricBlowoutRadiusUm, 4)}</td>
      <td className={figure}>{percentText(material.relativeErrorBound)}</td>
    </tr>
  );
}
