import type { Client } from 'pg';

export interface DemoPerson {
  name: string;
  email: string;
  roles: string[];
  title: string;
  assessor?: string;
  department?: string;
}

type Row = Record<string, unknown> & { id: string };

export interface SeededOrganisation extends Record<string, Row[] | string> {
  id: string;
  round: Row[];
  candidate: Row[];
  quote: Row[];
  criterion: Row[];
  membership: Row[];
  site: Row[];
  department: Row[];
  round_limit: Row[];
  link: Row[];
}

export const demoPassword: string;
export const demoSignIns: { organisation: string; role: string; name: string; email: string }[];
export function seedDemo(ownerUrl: string): Promise<boolean>;
export function seedOrganisation(
  client: Client,
  key: 'T1' | 'T2',
  people: DemoPerson[],
  passwordHash: string,
): Promise<SeededOrganisation>;
