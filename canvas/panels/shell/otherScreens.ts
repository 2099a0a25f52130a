/**
 * Every screen of a site besides the plan, and the list's own dialogs: one chunk, loaded after those of the plan and of the
 * forms (`metro.config.js` keeps what they share there). Each must be the only one to reach what is its own: the bundler puts whatever two
 * lazy chunks share into the page's first load.
 */
import './otherWords';

export { CompareScreen } from '../compare/CompareScreen';
export { CrewScreen } from '../crew/CrewScreen';
export { ElevationScreen } from '../elevation/ElevationScreen';
export { LevelsScreen } from '../levels/LevelsScreen';
export { MoreScreen } from '../more/MoreScreen';
export { PoleScreen } from '../pole/PoleScreen';
export { RevisionScreen } from '../revisions/RevisionScreen';
export { RevisionsScreen } from '../revisions/RevisionsScreen';
export { TakeoffScreen } from '../takeoff/TakeoffScreen';
export { AccountDialog } from '../sites/AccountDialog';
export { NewSiteDialog } from '../sites/NewSiteDialog';
export { ConflictDialog } from '../workspace/ConflictDialog';
