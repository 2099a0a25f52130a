import { lazy, Suspense, type ComponentType, type ReactNode } from 'react';
import { Loading } from '../../ui/States';

const loadForms = () => import('./formScreens');
const loadPlan = () => import('./planScreens');

/** The other screens borrow from the plan's chunk and the forms': both must be there before theirs runs (`metro.config.js`). */
async function loadOthers() {
  await Promise.all([loadPlan(), loadForms()]);
  return import('./otherScreens');
}

/** A screen, or a dialog that is seldom opened: fetched when first shown, with the sign of loading until then. */
function later<Screens, Props extends object>(
  load: () => Promise<Screens>,
  pick: (screens: Screens) => ComponentType<Props>,
  meanwhile: ReactNode = <Loading />,
): ComponentType<Props> {
  const Part = lazy(async () => ({ default: pick(await load()) }));
  return function LaterPart(props: Props) {
    return (
      <Suspense fallback={meanwhile}>
        <Part {...props} />
      </Suspense>
    );
  };
}

export const ForgotScreen = later(loadForms, (screens) => screens.ForgotScreen);
export const ResetScreen = later(loadForms, (screens) => screens.ResetScreen);
export const SignInScreen = later(loadForms, (screens) => screens.SignInScreen);
export const SignUpScreen = later(loadForms, (screens) => screens.SignUpScreen);

export const PlanScreen = later(loadPlan, (screens) => screens.PlanScreen);
export const SiteShell = later(loadPlan, (screens) => screens.SiteShell);

export const AccountDialog = later(loadOthers, (screens) => screens.AccountDialog, null);
export const CompareScreen = later(loadOthers, (screens) => screens.CompareScreen);
export const ConflictDialog = later(loadOthers, (screens) => screens.ConflictDialog, null);
export const CrewScreen = later(loadOthers, (screens) => screens.CrewScreen);
export const ElevationScreen = later(loadOthers, (screens) => screens.ElevationScreen);
export const LevelsScreen = later(loadOthers, (screens) => screens.LevelsScreen);
export const MoreScreen = later(loadOthers, (screens) => screens.MoreScreen);
export const NewSiteDialog = later(loadOthers, (screens) => screens.NewSiteDialog, null);
export const PoleScreen = later(loadOthers, (screens) => screens.PoleScreen);
export const RevisionScreen = later(loadOthers, (screens) => screens.RevisionScreen);
export const RevisionsScreen = later(loadOthers, (screens) => screens.RevisionsScreen);
export const TakeoffScreen = later(loadOthers, (screens) => screens.TakeoffScreen);

/** Fetches the code of a site's screens ahead of need: without signal later it is then already there. */
export async function fetchSiteScreens(): Promise<void> {
  await loadOthers();
}
