import Link from 'next/link';
import type { ReactNode } from 'react';
import { buttonClass, type ButtonSize, type ButtonVariant } from './button-style';

type Props = { href: string; variant?: ButtonVariant; size?: ButtonSize; download?: boolean; children: ReactNode };

/** Files are left to the browser; everything else stays in the application. */
export function LinkButton({ href, variant = 'secondary', size = 'normal', download, children }: Props) {
  const className = buttonClass(variant, size);
  if (download) {
    return (
      <a href={href} download className={className}>
        {children}
      </a>
    );
  }
  return (
    <Link href={href} className={className}>
      {children}
    </Link>
  );
}
