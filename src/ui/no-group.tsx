import { Notice } from './notice';
import { PageHeader } from './page-header';

/** In place of a page that shows what belongs to a group, for people who are in none. */
export function NoGroup({ title }: { title: string }) {
  return (
    <>
      <PageHeader title={title} />
      <Notice kind="info" title="You are in no group">
        Catalogues and runs belong to a group. Stars, materials and the calculator are open to you.
      </Notice>
    </>
  );
}
