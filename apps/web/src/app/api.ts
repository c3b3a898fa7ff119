import type { z } from 'zod';
import { problemFrom, unreachable, unreadable } from './api-problem';

type QueryValue = string | number | boolean | null | undefined;

export interface RequestOptions<S extends z.ZodType> {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Sent as JSON. */
  body?: unknown;
  /** What the answer must look like. */
  schema: S;
  /** Empty values are left out. */
  query?: Record<string, QueryValue>;
  /** Sent twice under the same key, the server does it once. */
  idempotencyKey?: string;
  headers?: Record<string, string>;
  signal?: AbortSignal;
}

function address(path: string, query: Record<string, QueryValue> = {}): string {
  const given = Object.entries(query).filter(
    ([, value]) => value !== undefined && value !== null && value !== '',
  );
  const search = new URLSearchParams(given.map(([key, value]) => [key, String(value)])).toString();
  return `/api${path}${search && `?${search}`}`;
}

/** Reads an answer's text by its schema. @throws {ApiProblem} */
export function readAnswer<S extends z.ZodType>(status: number, text: string, schema: S): z.output<S> {
  let body: unknown;
  try {
    body = text === '' ? undefined : JSON.parse(text);
  } catch {
    body = undefined;
  }
  if (status < 200 || status > 299) throw problemFrom(status, body);
  const parsed = schema.safeParse(body);
  if (!parsed.success) throw unreadable(status);
  return parsed.data;
}

/**
 * Calls the API, for example `request('/rides', { schema: ridePage, query: { page: 2 } })`.
 * @throws {ApiProblem} when the server refuses, answers strangely or can't be reached.
 */
export async function request<S extends z.ZodType>(
  path: string,
  options: RequestOptions<S>,
): Promise<z.output<S>> {
  const { method = 'GET', body, schema, query, idempotencyKey, signal } = options;
  const headers = new Headers({ ...options.headers, accept: 'application/json' });
  if (body !== undefined) headers.set('content-type', 'application/json');
  if (idempotencyKey) headers.set('idempotency-key', idempotencyKey);
  const sent = body === undefined ? undefined : JSON.stringify(body);
  let answer: { status: number; text: string };
  try {
    const response = await fetch(address(path, query), {
      method,
      headers,
      body: sent,
      signal,
      credentials: 'same-origin',
    });
    answer = { status: response.status, text: await response.text() };
  } catch (error) {
    if (signal?.aborted) throw error;
    throw unreachable();
  }
  return readAnswer(answer.status, answer.text, schema);
}
