/** The last bytes that begin a character whose end has not arrived yet; at most three. */
export function incompleteTail(bytes: Uint8Array): Uint8Array<ArrayBuffer> {
  for (let back = 1; back <= Math.min(3, bytes.length); back++) {
    const lead = bytes[bytes.length - back];
    if ((lead & 0xc0) === 0x80) continue;
    const length = lead >= 0xf0 ? 4 : lead >= 0xe0 ? 3 : lead >= 0xc0 ? 2 : 1;
    return length > back ? bytes.slice(-back) : new Uint8Array(0);
  }
  return new Uint8Array(0);
}

/** Index of the byte at which a strict decoder gives up; bytes.length when it does not. */
export function firstInvalidByte(bytes: Uint8Array): number {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  for (let at = 0; at < bytes.length; at++) {
    try {
      decoder.decode(bytes.subarray(at, at + 1), { stream: true });
    } catch (cause) {
      if (cause instanceof TypeError) return at;
      throw cause;
    }
  }
  return bytes.length;
}
