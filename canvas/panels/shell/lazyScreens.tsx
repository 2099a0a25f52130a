import { lazy, Suspense, type ComponentType, type ReactNode } from 'react';
import { Loading } from '../../ui/States';

const load = () => import('./siteScreens');

/** A screen of a site, or a dialog that is seldom opened: fetched when first shown, with the sign of loading until then. */
function later<Props extends object>(
  pick: (screens: Awaited<ReturnType<typeof load>>) => ComponentType<Props>,
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

export const AccountDialog = later((screens) => screens.AccountDialog, null);
export const CompareScreen = later((screens) => screens.CompareScreen);
export const CrewScreen = later((screens) => screens.CrewScreen);
export const ElevationScreen = later((screens) => screens.ElevationScreen);
export const LevelsScreen = later((screens) => screens.LevelsScreen);
export const MoreScreen = later((screens) => screens.MoreScreen);
export const NewSiteDialog = later((screens) => screens.NewSiteDialog, null);
export const PlanScreen = later((screens) => screens.PlanScreen);
export const PoleScreen = later((screens) => screens.PoleScreen);
export const RevisionScreen = later((screens) => screens.RevisionScreen);
export const RevisionsScreen = later((screens) => screens.RevisionsScreen);
export const SiteShell = later((screens) => screens.SiteShell);
export const TakeoffScreen = later((screens) => screens.TakeoffScreen);

/** Fetches the code of a site's screens ahead of need: without signal later it is then already there. */
export async function fetchSiteScreens(): Promise<void> {
  await load();
}
