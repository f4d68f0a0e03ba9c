import { ApiProblem, type ApiFieldProblem } from '@/src/ui/run-api';

export type Upload = { done: Promise<{ id: string }>; cancel(): void };

/** XMLHttpRequest, because fetch does not tell how much of a body has gone out. */
export function sendUpload(form: FormData, onProgress: (share: number) => void): Upload {
  const request = new XMLHttpRequest();
  const done = new Promise<{ id: string }>((resolve, reject) => {
    request.upload.onprogress = ({ loaded, total, lengthComputable }) => lengthComputable && onProgress(loaded / total);
    request.onerror = () => reject(new Error('network'));
    request.onabort = () => reject(new DOMException('cancelled', 'AbortError'));
    request.onload = () => {
      const body = parsed(request.responseText);
      if (request.status === 202 && typeof body.id === 'string') resolve({ id: body.id });
      else
        reject(
          new ApiProblem(
            request.status,
            body.detail ?? 'The server did not answer as expected. Try again in a moment.',
            body.errors,
          ),
        );
    };
  });
  request.open('POST', '/api/v1/catalogues');
  request.send(form);
  return { done, cancel: () => request.abort() };
}

type Answer = { id?: unknown; detail?: string; errors?: ApiFieldProblem[] };

/** Something between us and the server may have answered with anything. */
function parsed(text: string): Answer {
  try {
    const body: unknown = JSON.parse(text);
    return typeof body === 'object' && body !== null ? body : {};
  } catch {
    return {};
  }
}
