import type { z } from 'zod';
import { uploads, type newUploadBody, type Upload } from '@/shared/contracts/uploads';
import { access } from './access';
import { api } from './api';
import { newId } from './new-id';
import { notUnderstood, offline, parseJson, readProblem } from './problem';
import { addressOf, headersOf } from './request';

export interface UploadRequest {
  projectId: string;
  file: Blob & { name?: string; lastModified?: number };
  fields: z.input<typeof newUploadBody>;
  idempotencyKey?: string;
  /** Bytes that left, 0 to 1. Null while it is not known. */
  onProgress?: (share: number | null) => void;
  signal?: AbortSignal;
}

/** A token older than this is renewed first: a large file should not be sent twice. */
const freshSeconds = 60;

/** Sends a file with its fields, with progress, which fetch can't report. */
export async function sendUpload(request: UploadRequest): Promise<Upload> {
  const keyed = { ...request, idempotencyKey: request.idempotencyKey ?? newId() };
  const held = access.ageSeconds < freshSeconds ? access.token : null;
  const token = held ?? (await api.renewal.renewAfter(access.token));
  const first = await transfer(keyed, token);
  const { status, text, retryAfter } =
    first.status === 401 ? await transfer(keyed, await api.renewal.renewAfter(token)) : first;
  if (status < 200 || status > 299) throw readProblem(status, text, retryAfter);
  const parsed = uploads.make.reply.safeParse(parseJson(text));
  if (!parsed.success) throw notUnderstood(status);
  return parsed.data;
}

interface Answer {
  status: number;
  text: string;
  retryAfter: string | null;
}

function transfer(
  { projectId, file, fields, idempotencyKey, onProgress, signal }: UploadRequest,
  token: string,
): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const xhr = new XMLHttpRequest();
    const abort = () => xhr.abort();
    xhr.open(uploads.make.method, addressOf(uploads.make, { params: { projectId } }));
    for (const [name, value] of Object.entries(headersOf(uploads.make, { idempotencyKey }, token))) {
      xhr.setRequestHeader(name, value);
    }
    xhr.upload.onprogress = ({ lengthComputable, loaded, total }) =>
      onProgress?.(lengthComputable && total > 0 ? loaded / total : null);
    xhr.onload = () =>
      resolve({
        status: xhr.status,
        text: xhr.responseText,
        retryAfter: xhr.getResponseHeader('retry-after'),
      });
    xhr.onerror = () => reject(offline('The file did not arrive. Check the connection, then send it again.'));
    xhr.onabort = () => reject(offline('Sending the file was stopped.'));
    xhr.onloadend = () => signal?.removeEventListener('abort', abort);
    signal?.addEventListener('abort', abort);
    if (signal?.aborted) return reject(offline('Sending the file was stopped.'));
    xhr.send(formOf(file, fields));
  });
}

/** The fields come before the file, so that the server knows what it reads when the file begins. */
function formOf(file: UploadRequest['file'], fields: UploadRequest['fields']): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) if (value !== undefined) form.append(name, value);
  form.append('file', file, file.name ?? 'pasted.txt');
  return form;
}
