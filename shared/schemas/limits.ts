/**
 * Bounds of what is accepted, named once: they feed the schemas, the models and the `min`/`max` of inputs.
 * Lengths mm, masses g. Wide enough for any light model, tight enough that a slip of units is caught.
 */
export const LIMITS = {
  name: { max: 120 },
  note: { max: 2_000 },
  key: { max: 64 },
  lengthMm: { max: 20_000 },
  coordinateMm: { min: -20_000, max: 20_000 },
  massG: { max: 100_000 },
  share: { max: 0.9 },
  chordShare: { min: -1, max: 2 },
  density: { max: 25_000 },
  areal: { max: 20_000 },
  spread: { max: 5_000 },
  cv: { max: 1 },
  modulus: { max: 1_000 },
  strength: { max: 10_000 },
  surfaces: { max: 20 },
  panels: { max: 40 },
  parts: { max: 4_000 },
  items: { max: 1_000 },
  solids: { max: 1_000 },
  materials: { max: 500 },
  ribs: { max: 1_000 },
  sectionPoints: { min: 5, max: 1_000 },
  outlinePoints: { min: 3, max: 1_000 },
  email: { max: 254 },
  password: { min: 10, max: 128 },
  caption: { max: 500 },
  /** of one glider */
  photos: { max: 100 },
  /** bytes of a photo as it is sent */
  photoBytes: { max: 10_000_000 },
  /** of a photo as it is sent; a telephone of 2026 takes 50 million */
  photoPixels: { max: 100_000_000 },
  /** gliders copied at once */
  copies: { max: 50 },
  /** differences kept with a save */
  changes: { max: 100 },
  /** waiting for an answer, of one glider */
  invitations: { max: 30 },
  /** stock pieces of one user, those used and split up included */
  rack: { max: 10_000 },
  /** pieces that one file brings in */
  rackImport: { max: 2_000 },
  /** bytes of a table that is brought in */
  csvBytes: { max: 2_000_000 },
  /** pieces that one is split into, and leftovers of one that is used */
  splitParts: { max: 50 },
  /** wood trials of one glider, and groups and parts that one names */
  trials: { max: 50 },
  trialWoods: { max: 200 },
  /** weighings of one glider, corrections included, and readings of one */
  weighings: { max: 2_000 },
  repeats: { max: 50 },
  /** pieces of lead and putty at hand */
  ballastPieces: { max: 60 },
  /** records of one glider, scales under it, lines of the check, glides */
  firstFlights: { max: 200 },
  supports: { max: 12 },
  checks: { max: 60 },
  glides: { max: 60 },
  /** limits of one edition of a class, and own editions of one club */
  classLimits: { max: 40 },
  classEditions: { max: 300 },
  /** members of one club, and clubs that one person is in */
  clubMembers: { max: 2_000 },
  clubs: { max: 50 },
  /** gliders that are shown to one club */
  clubGliders: { max: 1_000 },
  /** bytes of a JSON body; a plan of 2,000 parts takes about half a megabyte */
  bodyBytes: { max: 4_000_000 },
} as const;
