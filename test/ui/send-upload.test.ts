import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { sendUpload } from '@/app/(app)/catalogues/new/send-upload';
import { ApiProblem } from '@/src/ui/run-api';

/** Stands in for the browser's request: keeps what was asked and lets the test answer. */
class FakeRequest {
  static last: FakeRequest;
  upload: { onprogress?: (event: Pick<ProgressEvent, 'loaded' | 'total' | 'lengthComputable'>) => void } = {};
  onload?: () => void;
  onerror?: () => void;
  onabort?: () => void;
  status = 0;
  responseText = '';
  opened: string[] = [];
  constructor() {
    FakeRequest.last = this;
  }
  open(...how: string[]) {
    this.opened = how;
  }
  send() {}
  abort() {
    this.onabort?.();
  }
  answer(status: number, body: string) {
    this.status = status;
    this.responseText = body;
    this.onload?.();
  }
}

beforeEach(() => vi.stubGlobal('XMLHttpRequest', FakeRequest));
afterEach(() => vi.unstubAllGlobals());

const start = (onProgress: (share: number) => void = () => undefined) => sendUpload(new FormData(), onProgress).done;

describe('sending a catalogue', () => {
  it('posts it and gives the id of what was stored', async () => {
    const done = start();
    FakeRequest.last.answer(202, '{"id":"abc","status":"checking"}');
    await expect(done).resolves.toEqual({ id: 'abc' });
    expect(FakeRequest.last.opened).toEqual(['POST', '/api/v1/catalogues']);
  });

  it('tells how much has gone out, when that is known', () => {
    const shares: number[] = [];
    void start((share) => shares.push(share));
    FakeRequest.last.upload.onprogress?.({ loaded: 30, total: 120, lengthComputable: true });
    FakeRequest.last.upload.onprogress?.({ loaded: 60, total: 0, lengthComputable: false });
    expect(shares).toEqual([0.25]);
  });

  it('passes on what the server refused, with its places', async () => {
    const done = start();
    const errors = [{ pointer: '/name', detail: 'is needed' }];
    FakeRequest.last.answer(422, JSON.stringify({ title: 'x', detail: 'The form is not valid.', errors }));
    const problem = await done.catch((error: unknown) => error);
    expect(problem).toBeInstanceOf(ApiProblem);
    expect(problem).toMatchObject({ status: 422, message: 'The form is not valid.', fields: errors });
  });

  it.each([
    [502, '<html>bad gateway</html>'],
    [202, '{}'],
    [200, '"fine"'],
    [500, 'null'],
  ])('an answer that is none (%d %s) becomes a sentence', async (status, body) => {
    const done = start();
    FakeRequest.last.answer(status, body);
    await expect(done).rejects.toThrow('The server did not answer as expected. Try again in a moment.');
  });

  it('breaks off when the person cancels, and tells that from a lost connection', async () => {
    const cancelled = sendUpload(new FormData(), () => undefined);
    cancelled.cancel();
    await expect(cancelled.done).rejects.toMatchObject({ name: 'AbortError' });
    const lost = start();
    FakeRequest.last.onerror?.();
    await expect(lost).rejects.toMatchObject({ name: 'Error' });
  });
});
