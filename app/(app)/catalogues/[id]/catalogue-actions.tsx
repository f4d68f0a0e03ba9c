import type { CatalogueItem } from '@/src/catalogues/schema';
import { LinkButton } from '@/src/ui/link-button';

/** What can be done next with a catalogue whose check has ended. */
export function CatalogueActions({ id, status }: Pick<CatalogueItem, 'id' | 'status'>) {
  if (status === 'checking') return null;
  return (
    <div className="flex flex-wrap gap-3">
      {status === 'ready' ? (
        <LinkButton href={`/runs/new?catalogueId=${id}`} variant="primary">
          Start a run with this catalogue
        </LinkButton>
      ) : (
        <LinkButton href="/catalogues/new" variant="primary">
          Upload a corrected file
        </LinkButton>
      )}
      <LinkButton href={`/api/v1/catalogues/${id}/original`} download>
        Download the original file
      </LinkButton>
    </div>
  );
}
