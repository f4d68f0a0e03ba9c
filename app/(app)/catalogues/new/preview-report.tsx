'use client';

import type { CataloguePreview } from '@/src/catalogues/preview-catalogue';
import { Notice } from '@/src/ui/notice';

const shownProblems = 8;

/** What the check in the browser found in the beginning of the file. */
export function PreviewReport({ preview }: { preview: CataloguePreview }) {
  if (preview.fault)
    return (
      <Notice kind="danger" title="The file cannot be read as it is">
        {preview.fault}
      </Notice>
    );
  const { accepted, problems, warnings } = preview;
  const badLines = new Set(problems.map(({ line }) => line)).size;
  return (
    <div className="grid gap-4">
      {problems.length === 0 ? (
        <Notice kind="ok">{`The first ${accepted.length.toLocaleString('en-US')} rows are in order.`}</Notice>
      ) : (
        <Notice
          kind="caution"
          title={`${badLines} of the first ${(accepted.length + badLines).toLocaleString('en-US')} rows ${badLines === 1 ? 'is' : 'are'} not valid`}
        >
          <ul className="mt-1 list-disc pl-5 text-sm">
            {problems.slice(0, shownProblems).map(({ line, column, value, reason }, index) => (
              <li key={index}>
                Line {line}
                {column && (
                  <>
                    , column <span className="font-mono">{column}</span>
                  </>
                )}
                {value !== null && (
                  <>
                    : “<span className="font-mono break-all">{value}</span>”
                  </>
                )}{' '}
                {reason}
              </li>
            ))}
          </ul>
          {problems.length > shownProblems && (
            <p className="mt-1 text-sm">and {problems.length - shownProblems} more.</p>
          )}
        </Notice>
      )}
      {warnings.map(({ code, message }) => (
        <Notice key={code + message} kind="info">
          {message}
        </Notice>
      ))}
    </div>
  );
}
