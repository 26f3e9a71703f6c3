import { ApiProblem, unreachable } from '../../lib/api/problem';
import { withQuery } from '../../lib/api/client';
import { announceSessionEnded } from '../../lib/api/session-ended';
import type { Upload } from './types';

/** Largest file the service takes, bytes. */
export const LARGEST_FILE = 200_000_000;

const answerOf = (request: XMLHttpRequest): object => {
  const isJson = (request.getResponseHeader('content-type') ?? '').includes('json');
  return isJson ? (JSON.parse(request.responseText) as object) : {};
};

/**
 * Sends a file as it is, telling how much of it (0 to 1) is sent; `fetch` cannot say that of what it sends.
 *
 * @throws ApiProblem where it is refused or the service cannot be reached.
 */
export function sendFile(towerId: number, file: File, onProgress: (share: number) => void): Promise<Upload> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', withQuery('/api/uploads', { towerId, name: file.name.slice(-200) }));
    request.setRequestHeader('content-type', 'application/octet-stream');
    request.setRequestHeader('accept', 'application/json');
    request.upload.onprogress = ({ loaded, total }) => onProgress(total === 0 ? 0 : loaded / total);
    request.onerror = () => reject(unreachable());
    request.onload = () => {
      if (request.status === 201) return resolve(answerOf(request) as Upload);
      const problem = new ApiProblem(request.status, answerOf(request));
      if (problem.code === 'sign-in-needed') announceSessionEnded();
      reject(problem);
    };
    request.send(file);
  });
}
