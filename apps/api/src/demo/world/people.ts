import type { Language, Role } from '@rimeward/contracts';
import { idOf } from '../chance';

export interface DemoPerson {
  id: string;
  role: Role;
  name: string;
  email: string;
  /** For a demo that anybody may open: known, so that it can be printed. */
  password: string;
  language: Language;
  blowOutSignedOff: boolean;
  crew: number | null;
}

export const demoCrews = ['Crew North', 'Crew Creek', 'Crew Ridge'].map((name) => ({
  id: idOf('crew', name),
  name,
}));

const person = (
  role: Role,
  name: string,
  password: string,
  crew: number | null = null,
  {
    language = 'en',
    blowOutSignedOff = role === 'technician' || role === 'supervisor',
  }: Partial<DemoPerson> = {},
): DemoPerson => ({
  id: idOf('person', name),
  role,
  name,
  email: `${name.split(' ')[0]?.toLowerCase()}@wrenfield.example`,
  password,
  language,
  blowOutSignedOff,
  crew,
});

/** The last technician is new: nobody has signed him off for blow-out work yet. */
export const demoPeople: DemoPerson[] = [
  person('owner', 'Idris Halloway', 'granite lantern orchard'),
  person('office', 'Petra Vance', 'paper kettle afternoon'),
  person('supervisor', 'Nadine Oakes', 'early gauge and coffee'),
  person('supervisor', 'Tobias Renn', 'gravel road in october'),
  person('technician', 'Marlo Quist', 'copper valve half open', 0),
  person('technician', 'Ansel Brandt', 'hose reel on the trailer', 0),
  person('technician', 'Ximena Robledo', 'manguera del remolque', 1, { language: 'es' }),
  person('technician', 'Corwin Pell', 'frost on the windshield', 1),
  person('technician', 'Delia Marsh', 'twelve zones by noon', 2),
  person('technician', 'Jonah Tuft', 'new boots and gloves', 2, { blowOutSignedOff: false }),
];

export function peopleOfCrew(crew: number): DemoPerson[] {
  return demoPeople.filter((one) => one.crew === crew);
}
