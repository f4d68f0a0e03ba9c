import { LinkButton } from './link-button';

export function NothingHere() {
  return (
    <div className="grid gap-5">
      <h1 className="text-3xl">There is nothing here</h1>
      <p className="text-muted">The address is wrong, or what it led to is not yours to see.</p>
      <div>
        <LinkButton href="/home" variant="primary">
          To your group
        </LinkButton>
      </div>
    </div>
  );
}
