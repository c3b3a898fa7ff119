import type { z } from 'zod';
import { readAnswer } from './api';
import { unreachable } from './api-problem';

interface UploadOptions<S extends z.ZodType> {
  schema: S;
  /** Share of the bytes sent so far, 0 to 1. */
  onProgress?: (share: number) => void;
  signal?: AbortSignal;
}

/** POSTs a multipart form and tells how far it is, which fetch can't. @throws {ApiProblem} */
export function upload<S extends z.ZodType>(
  path: string,
  form: FormData,
  options: UploadOptions<S>,
): Promise<z.output<S>> {
  const { schema, onProgress, signal } = options;
  return new Promise((resolve, reject) => {
    const call = new XMLHttpRequest();
    call.open('POST', `/api${path}`);
    call.setRequestHeader('accept', 'application/json');
    call.upload.onprogress = ({ loaded, total }) => onProgress?.(total > 0 ? loaded / total : 0);
    call.onerror = () => reject(unreachable());
    call.onabort = () => reject(new DOMException('The upload was stopped.', 'AbortError'));
    call.onload = () => {
      try {
        resolve(readAnswer(call.status, call.responseText, schema));
      } catch (error) {
        reject(error);
      }
    };
    signal?.addEventListener('abort', () => call.abort());
    call.send(form);
  });
}
