'use client';

import { SomethingWentWrong, type ErrorPageProps } from '@/src/ui/something-went-wrong';
import { Wordmark } from '@/src/ui/wordmark';

export default function ErrorPage(props: ErrorPageProps) {
  return (
    <main id="content" className="mx-auto grid max-w-xl gap-5 px-5 py-16">
      <Wordmark />
      <SomethingWentWrong {...props} />
    </main>
  );
}
