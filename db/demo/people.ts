/** The people of the demo sites, all invented, at addresses that no mail can reach. */
import type { Role } from '../../model/contracts/common';

export interface DemoPerson {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  /** Their role on each demo site. */
  readonly cedarBend: Role;
  readonly harrowLane: Role;
}

/** The one password of them all: the demo is for trying, on a machine of one's own. */
export const DEMO_PASSWORD = 'level-line-48';

export const DEMO_PEOPLE = [
  { id: 'demo-lead', name: 'Ines Halloran', email: 'lead@cedarbend.example', cedarBend: 'lead', harrowLane: 'lead' },
  {
    id: 'demo-designer',
    name: 'Tobias Renwick',
    email: 'designer@cedarbend.example',
    cedarBend: 'designer',
    harrowLane: 'observer',
  },
  {
    id: 'demo-mason',
    name: 'Dalia Oduya',
    email: 'mason@cedarbend.example',
    cedarBend: 'mason',
    harrowLane: 'designer',
  },
  {
    id: 'demo-observer',
    name: 'Piet Vansel',
    email: 'observer@cedarbend.example',
    cedarBend: 'observer',
    harrowLane: 'mason',
  },
] as const satisfies readonly DemoPerson[];
