'use client';

import { usePathname } from 'next/navigation';
import { useEffect, useRef, type FocusEvent, type KeyboardEvent, type ReactNode } from 'react';

type Props = { summary: ReactNode; summaryClass: string; className?: string; children: ReactNode };

/** Opens without script; with script it also closes again: after a move, on Escape, and when attention goes elsewhere. */
export function Disclosure({ summary, summaryClass, className = '', children }: Props) {
  const details = useRef<HTMLDetailsElement>(null);
  const path = usePathname();
  const close = () => details.current?.removeAttribute('open');

  useEffect(close, [path]);
  useEffect(() => {
    const closeWhenOutside = ({ target }: PointerEvent) => {
      if (!details.current?.contains(target as Node)) close();
    };
    document.addEventListener('pointerdown', closeWhenOutside);
    return () => document.removeEventListener('pointerdown', closeWhenOutside);
  }, []);

  const closeOnEscape = ({ key }: KeyboardEvent) => {
    if (key !== 'Escape' || !details.current?.open) return;
    close();
    details.current.querySelector('summary')?.focus();
  };
  const closeWhenLeft = ({ currentTarget, relatedTarget }: FocusEvent) => {
    if (relatedTarget && !currentTarget.contains(relatedTarget)) close();
  };
  return (
    <details ref={details} className={`relative ${className}`} onKeyDown={closeOnEscape} onBlur={closeWhenLeft}>
      <summary className={`list-none [&::-webkit-details-marker]:hidden ${summaryClass}`}>{summary}</summary>
      {children}
    </details>
  );
}
