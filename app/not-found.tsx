import { NothingHere } from '@/src/ui/nothing-here';
import { Wordmark } from '@/src/ui/wordmark';

export default function NotFound() {
  return (
    <main id="content" className="mx-auto grid max-w-xl gap-5 px-5 py-16">
      <Wordmark />
      <NothingHere />
    </main>
  );
}
