/** The plan and what stands around every screen of a site: the chunk that a site is opened with, and that the other screens borrow from. */
import './planWords';

export { PlanScreen } from '../plan/PlanScreen';
export { SiteShell } from './SiteShell';
