import { understoodNames } from '@/src/catalogues/understood-names';
import { exampleHref } from './example-catalogue';

export function ColumnHelp() {
  return (
    <details className="text-sm">
      <summary className="w-fit py-1 underline decoration-chaff underline-offset-4">
        Which columns are understood
      </summary>
      <p className="mt-2 max-w-prose">
        {understoodNames} Other names can be assigned by hand once the file is chosen; a column that holds nothing of
        these is left out.
      </p>
      <p className="mt-2">
        <a href={exampleHref} download="catalogue-example.csv" className="prose-link">
          Download an example file to fill in
        </a>
      </p>
    </details>
  );
}
