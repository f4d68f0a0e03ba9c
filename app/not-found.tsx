import { LinkButton } from '@/src/ui/link-button';
import { Wordmark } from '@/src/ui/wordmark';

export default function NotFound() {
  return (
    <main id="content" className="mx-auto grid max-w-xl gap-5 px-5 py-16">
      <Wordmark />
      <h1 className="text-3xl">There is nothing here</h1>
      <p className="text-muted">The address is wrong, or what it led to is not yours to see.</p>
      <div>
        <LinkButton href="/home" variant="primary">
          To your group
        </LinkButton>
      </div>
    </main>
  );
}
