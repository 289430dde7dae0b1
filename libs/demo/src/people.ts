import { demoId } from './demoId';

export interface DemoPerson {
  id: string;
  name: string;
  email: string;
  role: 'technician' | 'trainee' | 'lead';
}

/** The people of the yard. All invented. */
export const people = {
  lead: {
    id: demoId('person', 1),
    name: 'Maren Thistlewood',
    email: 'maren@thornwick-yard.example',
    role: 'lead',
  },
  ruben: {
    id: demoId('person', 2),
    name: 'Ruben Askeland',
    email: 'ruben@thornwick-yard.example',
    role: 'technician',
  },
  ines: {
    id: demoId('person', 3),
    name: 'Ines Corbray',
    email: 'ines@thornwick-yard.example',
    role: 'technician',
  },
  dell: {
    id: demoId('person', 4),
    name: 'Dell Oyamada',
    email: 'dell@thornwick-yard.example',
    role: 'technician',
  },
  trainee: {
    id: demoId('person', 5),
    name: 'Joss Penhallow',
    email: 'joss@thornwick-yard.example',
    role: 'trainee',
  },
} as const satisfies Record<string, DemoPerson>;
