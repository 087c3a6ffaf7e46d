export interface DemoPerson {
  name: string;
  email: string;
  password: string;
  role: string;
}

/** The sign-ins of the demo's people as lines in columns. */
export function demoLines(demo: { people: DemoPerson[] }): string[];
