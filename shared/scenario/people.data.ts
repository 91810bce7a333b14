import type { ScenarioPerson } from './scenario-types';

/** Invented names; `.example` addresses reach nobody (RFC 2606). */
export const people: ScenarioPerson[] = [
  { key: 'verrin', name: 'Anouk Verrin', role: 'lead', teamLead: true, outside: false },
  { key: 'hadwin', name: 'Pell Hadwin', role: 'lead', teamLead: false, outside: false },
  { key: 'corrow', name: 'Sana Corrow', role: 'curator', teamLead: false, outside: false },
  { key: 'marrick', name: 'Teo Marrick', role: 'contributor', teamLead: false, outside: false },
  { key: 'brant', name: 'Ysolde Brant', role: 'contributor', teamLead: false, outside: false },
  { key: 'ostrey', name: 'Livia Ostrey', role: 'reader', teamLead: false, outside: true },
].map((person) => ({ ...person, role: person.role as ScenarioPerson['role'], email: address(person) }));

function address(person: { name: string; outside: boolean }): string {
  const [first = '', last = ''] = person.name.toLowerCase().split(' ');
  return `${first}.${last}@${person.outside ? 'farshore.example' : 'windlass.example'}`;
}

export const teamName = 'Windlass consortium';
export const projectName = 'Ten-ring motor';
