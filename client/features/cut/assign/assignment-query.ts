import { queryOptions } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import {
  gliderAssignment,
  type AssignmentInput,
  type GliderAssignmentDto,
} from '#shared/schemas/assignment.ts';

const pathOf = (glider: string) => `/gliders/${encodeURIComponent(glider)}/assignment`;

export const assignmentQuery = (glider: string) =>
  queryOptions({
    queryKey: ['gliders', 'assignment', glider],
    queryFn: ({ signal }) => request(pathOf(glider), gliderAssignment, { signal }),
  });

/** @throws ApiError 412 with the one kept meanwhile as `current`, 400 for pieces that are gone */
export function keepAssignment(
  glider: string,
  input: AssignmentInput,
  version: number,
): Promise<GliderAssignmentDto> {
  return request(pathOf(glider), gliderAssignment, {
    method: 'PUT',
    body: input,
    headers: { 'If-Match': `"${version}"` },
  });
}
