'use client';

import type { CatalogueItem } from '@/src/catalogues/schema';
import { Notice } from '@/src/ui/notice';

/** Says how far the catalogue is, and says it again to those who listen when that changes. */
export function CatalogueStatus({ catalogue }: { catalogue: CatalogueItem }) {
  const { status, failure, warnings, rows } = catalogue;
  return (
    <div className="grid">
      <div role="status" className="grid [&>*]:mb-4">
        {status === 'checking' && <Notice kind="info">The catalogue is being checked.</Notice>}
        {status === 'failed' && (
          <Notice kind="danger" title="This catalogue was not accepted">
            {failure}
          </Notice>
        )}
        {status === 'ready' && <p className="sr-only">{rows.accepted.toLocaleString('en-US')} grains are ready.</p>}
      </div>
      {status === 'checking' && (
        <p className="text-muted mb-4 tabular-nums">{rows.checked.toLocaleString('en-US')} rows read so far.</p>
      )}
      <div className="grid [&>*]:mb-4">
        {warnings.map((warning) => (
          <Notice key={warning} kind="caution">
            {warning}
          </Notice>
        ))}
      </div>
    </div>
  );
}
