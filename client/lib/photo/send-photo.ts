import { ApiError, NetworkError, UnexpectedAnswer } from '#client/lib/api.ts';
import { photo, type PhotoDto } from '#shared/schemas/photo.ts';
import { problem } from '#shared/schemas/problem.ts';

interface SendOptions {
  gliderId: string;
  file: Blob;
  name: string;
  /** Made once per photo, so that a retry on a bad line adds one. */
  wish: string;
  /** 0–1, of what has to be sent */
  onProgress: (share: number) => void;
  signal: AbortSignal;
}

/** Sends a photo and tells how far it has come, which `fetch` cannot. */
export function sendPhoto({
  gliderId,
  file,
  name,
  wish,
  onProgress,
  signal,
}: SendOptions): Promise<PhotoDto> {
  const form = new FormData();
  form.set('photo', file, name);
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', `/api/gliders/${encodeURIComponent(gliderId)}/photos`);
    request.setRequestHeader('Accept', 'application/json');
    request.setRequestHeader('Idempotency-Key', wish);
    request.upload.addEventListener('progress', ({ loaded, total, lengthComputable }) => {
      if (lengthComputable) onProgress(loaded / total);
    });
    request.addEventListener('load', () => {
      const answer = answerOf(request);
      if (answer instanceof Error) reject(answer);
      else resolve(answer);
    });
    request.addEventListener('error', () => reject(new NetworkError(null)));
    request.addEventListener('abort', () => reject(new DOMException('Stopped.', 'AbortError')));
    signal.addEventListener('abort', () => request.abort());
    request.send(form);
  });
}

function answerOf({
  status,
  responseText,
}: Pick<XMLHttpRequest, 'status' | 'responseText'>): PhotoDto | Error {
  let body: unknown;
  try {
    body = JSON.parse(responseText);
  } catch {
    return status >= 502 && status <= 504 ? new NetworkError(status) : new UnexpectedAnswer(status);
  }
  if (status >= 200 && status < 300) {
    const added = photo.safeParse(body);
    return added.success ? added.data : new UnexpectedAnswer(added.error);
  }
  const refused = problem.safeParse(body);
  return refused.success ? new ApiError(refused.data) : new UnexpectedAnswer(status);
}
