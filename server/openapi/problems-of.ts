import type { ProblemCode } from '#server/errors.ts';
import type { Endpoint } from '#server/http/endpoint.ts';

/** Every refusal that an endpoint may answer: those it names, and those that follow from what it is. */
export function problemsOf(endpoint: Endpoint): ProblemCode[] {
  const { schemas, access, path, method, limits } = endpoint;
  const codes: ProblemCode[] = [
    ...(schemas.params || schemas.query || schemas.body || endpoint.idempotent
      ? (['invalid_input'] as const)
      : []),
    ...(schemas.body ? ([endpoint.upload ? 'malformed_form' : 'malformed_json'] as const) : []),
    ...(schemas.body ? (['too_large', 'unsupported_type'] as const) : []),
    ...(access === 'signed-in' ? (['signed_out'] as const) : []),
    ...(method !== 'get' ? (['forbidden'] as const) : []),
    ...(path.includes(':') ? (['not_found'] as const) : []),
    ...(endpoint.ifMatch ? (['if_match_required', 'stale_version'] as const) : []),
    ...(endpoint.idempotent ? (['key_reused'] as const) : []),
    ...(limits ? (['rate_limited'] as const) : []),
    ...(endpoint.problems ?? []),
    'internal',
    'unavailable',
  ];
  return [...new Set(codes)];
}
