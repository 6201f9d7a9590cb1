import { refresh, sessionSchema } from '@/shared/contracts/auth';
import {
  API_ROOT,
  type BodyOf,
  type Contract,
  type ParamsOf,
  type QueryOf,
  type ResponseOf,
} from '@/shared/contracts/contract';
import { problemSchema } from '@/shared/problems/problem';
import { ApiError, type ApiProblem } from './api-problem';
import { dropSession, keptPerson, session, takeSession } from './session';

/** A call by contract: path parameters, query and body as the contract types them. */
export interface CallInput<C extends Contract> {
  readonly params?: ParamsOf<C>;
  readonly query?: QueryOf<C>;
  readonly body?: BodyOf<C>;
  /** One for every thing a person makes, kept over retries, so that a resend makes nothing twice. */
  readonly idempotencyKey?: string;
  readonly signal?: AbortSignal;
}

/**
 * Calls one address of the API.
 *
 * @returns the answer, checked against the contract
 * @throws ApiError with one ApiProblem; an expired sign-in is renewed once before it counts
 */
export async function call<C extends Contract>(contract: C, input: CallInput<C> = {}): Promise<ResponseOf<C>> {
  let response = await send(contract, input);
  if (response.status === 401 && contract.may !== 'public' && (await renewSession()))
    response = await send(contract, input);
  if (!response.ok) throw new ApiError(await problemOf(response));
  if (contract.response === null) return undefined as ResponseOf<C>;
  const parsed = contract.response.safeParse(await response.json());
  if (!parsed.success) throw new ApiError({ kind: 'server', status: response.status });
  return parsed.data as ResponseOf<C>;
}

/** Address of a call, for links and downloads. */
export function addressOf<C extends Contract>(contract: C, input: CallInput<C> = {}): string {
  const params = (input.params ?? {}) as Record<string, string>;
  const path = contract.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));
  const query = Object.entries((input.query ?? {}) as Record<string, unknown>).flatMap(([key, value]) =>
    value === undefined ? [] : [[key, String(value)] as [string, string]],
  );
  return `${API_ROOT}${path}${query.length > 0 ? `?${new URLSearchParams(query).toString()}` : ''}`;
}

async function send<C extends Contract>(contract: C, input: CallInput<C>): Promise<Response> {
  const { accessToken } = session.getState();
  const headers: Record<string, string> = { accept: 'application/json' };
  if (accessToken) headers.authorization = `Bearer ${accessToken}`;
  if (input.body !== undefined) headers['content-type'] = 'application/json';
  if (contract.creates) headers['idempotency-key'] = input.idempotencyKey ?? crypto.randomUUID();
  try {
    return await fetch(addressOf(contract, input), {
      method: contract.method.toUpperCase(),
      headers,
      credentials: 'same-origin',
      ...(input.body !== undefined && { body: JSON.stringify(input.body) }),
      ...(input.signal && { signal: input.signal }),
    });
  } catch (error) {
    if (input.signal?.aborted) throw error;
    throw new ApiError({ kind: 'offline' });
  }
}

/** Fetches something that is not JSON (a PDF) with the page's sign-in. */
export async function fetchFile(address: string): Promise<Blob> {
  const get = async () => {
    const { accessToken } = session.getState();
    try {
      return await fetch(address, {
        credentials: 'same-origin',
        headers: accessToken ? { authorization: `Bearer ${accessToken}` } : {},
      });
    } catch {
      throw new ApiError({ kind: 'offline' });
    }
  };
  let response = await get();
  if (response.status === 401 && (await renewSession())) response = await get();
  if (!response.ok) throw new ApiError(await problemOf(response));
  return response.blob();
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const body: unknown = await response.json().catch(() => null);
  const parsed = problemSchema.safeParse(body);
  if (!parsed.success) return { kind: 'server', status: response.status };
  const { code, detail, issues } = parsed.data;
  if (code === 'not_signed_in' || code === 'session_ended') return { kind: 'signed-out' };
  return { kind: 'problem', status: response.status, code, detail, issues: issues ?? [], body };
}

let renewing: Promise<boolean> | null = null;

/** Exchanges the refresh cookie for a new access token; several calls at once share one exchange. */
export function renewSession(): Promise<boolean> {
  renewing ??= renew().finally(() => {
    renewing = null;
  });
  return renewing;
}

async function renew(): Promise<boolean> {
  const response = await send(refresh, {});
  if (!response.ok) {
    if (response.status === 401) dropSession();
    return false;
  }
  const parsed = sessionSchema.safeParse(await response.json());
  if (!parsed.success) return false;
  takeSession(parsed.data.accessToken, parsed.data.me);
  return true;
}

/** At the start of the page: renew the sign-in, or open with whoever was here last when there is no signal. */
export async function startSession(): Promise<void> {
  try {
    if (!(await renewSession()) && session.getState().status === 'starting') dropSession();
  } catch {
    const person = keptPerson();
    if (person) takeSession(null, person);
    else dropSession();
  }
}
