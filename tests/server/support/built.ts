import { randomUUID } from 'node:crypto';
import type { FirstFlightInput } from '#shared/schemas/first-flight.ts';
import type { BuildTermsInput, WeighingInput } from '#shared/schemas/weighing.ts';

/** The ribs of the small glider's port half on a scale of 0.1 g. */
export function weighingBody(changes: Partial<WeighingInput> = {}): WeighingInput {
  return {
    title: 'Ribs, port',
    stage: 'part',
    covers: [{ line: 'wing/ribs', side: 'port' }],
    values: [5.2, 5.3],
    tare: 0.2,
    resolution: 0.1,
    x: null,
    density: null,
    thickness: null,
    photoId: null,
    note: '',
    gliderVersion: 1,
    weighedAt: '2026-11-21T18:30:00.000Z',
    corrects: null,
    reason: '',
    withdraws: false,
    ...changes,
  };
}

export function buildTermsBody(changes: Partial<BuildTermsInput> = {}): BuildTermsInput {
  return {
    target: 120,
    least: 110,
    most: null,
    pieces: [{ id: 'shot', name: 'Lead shot', mass: 2.5, divisible: false }],
    ballastAt: -120,
    ballastRoom: 15,
    ...changes,
  };
}

/** 120 g on two scales, 80 mm aft of the datum, and 5 g in the nose. */
export function firstFlightBody(changes: Partial<FirstFlightInput> = {}): FirstFlightInput {
  const support = { tare: 0, resolution: 0.1, y: 0, ux: 0.5 };
  return {
    id: randomUUID(),
    gliderVersion: 1,
    forecast: { mass: 119, u: 2, x: 79, ux: 1.5, percentMac: 39.5 },
    method: {
      kind: 'supports',
      supports: [
        { ...support, name: 'Front', reading: 90, x: 40 },
        { ...support, name: 'Rear', reading: 30, x: 200 },
      ],
    },
    range: { from: 70, to: 78, basis: 'plan' },
    ballast: [{ name: 'Lead in the nose', mass: 5, x: -120, y: 0 }],
    checks: [
      { id: 'spar-joint', words: 'The wing joint holds without play.', answer: 'yes', note: '' },
      { id: 'battery', words: 'The battery is charged.', answer: 'not_on_this_model', note: '' },
    ],
    place: 'Larkmoor, upper field',
    wind: 1.5,
    glides: [{ behaviour: 'stalls', note: 'One gram more in the nose' }],
    note: '',
    signature: 'Tobias Fell',
    signedAt: '2026-11-22T09:10:00.000Z',
    follows: null,
    ...changes,
  };
}
