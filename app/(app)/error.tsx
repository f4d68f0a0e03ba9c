'use client';

import { SomethingWentWrong, type ErrorPageProps } from '@/src/ui/something-went-wrong';

/** Keeps the navigation around a page that failed. */
export default function ShellErrorPage(props: ErrorPageProps) {
  return <SomethingWentWrong {...props} />;
}
