import { firstFlight, firstFlightInput, firstFlightList } from '#shared/schemas/first-flight.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { keepFirstFlight, listFirstFlights } from '#server/services/first-flights.ts';
import { idParams } from './inputs.ts';

const tag = 'First flight';

export const firstFlightEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/first-flights',
    tag,
    summary: 'Signed records of first flights, newest first',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: firstFlightList },
    handle: async ({ actor, params }) => ({ body: await listFirstFlights(actor, params.id) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/first-flights',
    tag,
    summary: 'Keep a signed record; sent again under its id it is kept once',
    access: 'signed-in',
    params: idParams,
    body: firstFlightInput,
    answer: { status: 201, schema: firstFlight },
    problems: ['signed_already'],
    handle: async ({ actor, params, body }) => ({ body: await keepFirstFlight(actor, params.id, body) }),
  }),
];
