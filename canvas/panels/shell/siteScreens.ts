/**
 * Every screen of a site and the list's own dialogs, behind one door. The bundler puts whatever two lazy chunks share into the page's first load, so the
 * drawing's packages and the solver stay out of it only while a single chunk, this one, reaches them.
 */
import './siteWords';

export { CompareScreen } from '../compare/CompareScreen';
export { CrewScreen } from '../crew/CrewScreen';
export { ElevationScreen } from '../elevation/ElevationScreen';
export { LevelsScreen } from '../levels/LevelsScreen';
export { MoreScreen } from '../more/MoreScreen';
export { PlanScreen } from '../plan/PlanScreen';
export { PoleScreen } from '../pole/PoleScreen';
export { RevisionScreen } from '../revisions/RevisionScreen';
export { RevisionsScreen } from '../revisions/RevisionsScreen';
export { TakeoffScreen } from '../takeoff/TakeoffScreen';
export { AccountDialog } from '../sites/AccountDialog';
export { NewSiteDialog } from '../sites/NewSiteDialog';
export { SiteShell } from './SiteShell';
