import { ConnectionError, ProblemError, problemFrom } from './problem-error.ts';

interface UploadOptions {
  readonly file: Blob;
  readonly fileName: string;
  /** Text parts beside the file; JSON ones already written out. */
  readonly parts?: Readonly<Record<string, string>>;
  /** From 0 to 1; 1 means that all is sent and the server is reading. */
  readonly onProgress?: (share: number) => void;
  readonly signal?: AbortSignal;
  readonly idempotencyKey?: string;
}

/** Sends one file in the part `file`. XMLHttpRequest, because fetch tells nothing of what is sent. */
export function upload<Answer>(path: string, options: UploadOptions): Promise<Answer> {
  const { file, fileName, parts = {}, onProgress, signal, idempotencyKey } = options;
  const form = new FormData();
  for (const [name, text] of Object.entries(parts)) form.append(name, text);
  form.append('file', file, fileName);
  return new Promise<Answer>((resolve, reject) => {
    const aborted = () => reject(new DOMException('The upload was cancelled.', 'AbortError'));
    if (signal?.aborted === true) {
      aborted();
      return;
    }
    const call = new XMLHttpRequest();
    const abort = () => call.abort();
    signal?.addEventListener('abort', abort);
    call.addEventListener('loadend', () => signal?.removeEventListener('abort', abort));
    call.upload.addEventListener('progress', (event) => {
      if (event.lengthComputable) onProgress?.(event.loaded / event.total);
    });
    call.addEventListener('abort', aborted);
    call.addEventListener('error', () => reject(new ConnectionError()));
    call.addEventListener('load', () => {
      if (call.status >= 200 && call.status < 300) resolve(JSON.parse(call.responseText) as Answer);
      else reject(new ProblemError(problemFrom(call.status, call.responseText)));
    });
    call.open('POST', path);
    call.setRequestHeader('Accept', 'application/json');
    if (idempotencyKey !== undefined) call.setRequestHeader('Idempotency-Key', idempotencyKey);
    call.send(form);
  });
}
