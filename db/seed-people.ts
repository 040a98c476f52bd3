import { type Role, type UnitSystem } from '../lib/schemas/vocabulary';

/** The people of the demo. All invented; example.com and example.org are reserved names. */
export const demoPassword = 'cedar-and-rain-42';

export type DemoPerson = { key: string; name: string; email: string; role: Role; units: UnitSystem; company?: string; who: string };

export const demoPeople: DemoPerson[] = [
  { key: 'marit', name: 'Marit Lindqvist', email: 'marit@example.com', role: 'homeowner', units: 'us', who: 'Homeowner: a house in Montana and a rental cabin in North Carolina' },
  { key: 'tobias', name: 'Tobias Okafor', email: 'tobias@example.com', role: 'homeowner', units: 'us', who: 'Homeowner: a lake house in Minnesota, set up a short while ago' },
  { key: 'wendell', name: 'Wendell Pruitt', email: 'wendell@example.com', role: 'homeowner', units: 'us', who: 'Homeowner: a weathered bunkhouse in Montana' },
  { key: 'june', name: 'June Castellano', email: 'june@example.com', role: 'homeowner', units: 'metric', who: "Caretaker of Marit's rental cabin" },
  { key: 'harlan', name: 'Harlan Voss', email: 'harlan@example.org', role: 'contractor', units: 'us', company: 'Voss & Daughter Refinishing', who: 'Contractor in Montana' },
  { key: 'odile', name: 'Odile Marchetti', email: 'odile@example.org', role: 'contractor', units: 'us', company: 'Blue Hollow Wood Care', who: 'Contractor in North Carolina' },
  { key: 'reva', name: 'Reva Sandoval', email: 'reva@example.org', role: 'operator', units: 'us', who: 'Operator of the service' },
];

export const demoSignIns = demoPeople.map(({ who, email }) => ({ who, email, password: demoPassword }));
