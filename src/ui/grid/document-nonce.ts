/** The nonce of the page as it was loaded: after moves between pages the policy of the first answer still holds. */
export function documentNonce(): string | undefined {
  return document.querySelector<HTMLScriptElement>('script[nonce]')?.nonce || undefined;
}
