export interface DemoPerson {
  name: string;
  email: string;
  password: string;
}

/** The sign-ins of the demo people as lines in columns. */
export function demoLines(people: DemoPerson[]): string[];
