import { NextResponse, type NextRequest } from 'next/server';
import { contentSecurityPolicy } from '@/src/web/content-security-policy';

/** Gives every page a nonce of its own. Uploads do not pass here: the proxy would cut their bodies at 10 MB. */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.randomUUID()).toString('base64');
  const policy = contentSecurityPolicy(nonce);
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  return response;
}

export const config = { matcher: ['/((?!api/|health/|_next/static|_next/image|icon.svg).*)'] };
