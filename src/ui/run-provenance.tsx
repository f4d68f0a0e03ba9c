'use client';

import Link from 'next/link';
import type { ReactNode } from 'react';
import type { RunItem } from '@/src/runs/schema';
import { percentText } from './run-figures';
import { inputsOf } from './run-inputs-of';
import { Moment } from './run-moment';
import { useRunSource } from './run-source';
import { RunSection } from './run-section';

/** What another person needs to get the same numbers. */
export function RunProvenance({ run }: { run: RunItem }) {
  const { isShared } = useRunSource(run.id);
  const { catalogue } = inputsOf(run);
  return (
    <RunSection id="provenance" title="Provenance">
      <dl className="grid gap-x-6 gap-y-3 text-sm sm:grid-cols-[9rem_1fr]">
        <Line term={isShared ? 'Requested' : 'Requested by'}>
          {!isShared && `${run.requestedBy}, `}
          <Moment iso={run.createdAt} />
        </Line>
        {run.finishedAt && (
          <Line term="Finished">
            <Moment iso={run.finishedAt} />
          </Line>
        )}
        <Line term="Engine">version {run.engineVersion}</Line>
        {!isShared && (
          <Line term="Run number">
            <Sum>{run.id}</Sum>
          </Line>
        )}
        <Line term="Catalogue">
          {isShared ? (
            catalogue.name
          ) : (
            <Link href={`/catalogues/${catalogue.id}`} className="underline">
              {catalogue.name}
            </Link>
          )}
          <span className="text-muted block">SHA-256</span>
          <Sum>{catalogue.sha256}</Sum>
        </Line>
        {run.resultSha256 && (
          <Line term="Result">
            <span className="text-muted block">SHA-256 over the result columns</span>
            <Sum>{run.resultSha256}</Sum>
          </Line>
        )}
        {run.summary?.perMaterial.map(({ material, name, relativeErrorBound, shareOutsideValidRange }) => (
          <Line key={material} term={name}>
            error bound of beta {percentText(relativeErrorBound)}
            <span className="text-muted block">
              starlight outside the measured wavelengths: {percentText(shareOutsideValidRange)}
            </span>
          </Line>
        ))}
      </dl>
    </RunSection>
  );
}

function Line({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div className="contents">
      <dt className="text-muted">{term}</dt>
      <dd className="min-w-0">{children}</dd>
    </div>
  );
}

const Sum = ({ children }: { children: ReactNode }) => <span className="font-mono text-xs break-all">{children}</span>;
