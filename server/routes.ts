/** Every route of the API, apart from better-auth's and the description itself. */
import { draftRoutes } from './drawings/draftRoutes';
import { revisionRoutes } from './drawings/revisionRoutes';
import { setAsideRoutes } from './drawings/setAsideRoutes';
import { sheetRoutes } from './drawings/sheetRoutes';
import { solveRoutes } from './drawings/solveRoutes';
import { metaRoutes } from './http/metaRoutes';
import type { Route } from './http/route';
import { mailRoutes } from './mail/mailRoutes';
import { crewRoutes } from './sites/crewRoutes';
import { invitationRoutes } from './sites/invitationRoutes';
import { siteRoutes } from './sites/siteRoutes';

export const routes: readonly Route[] = [
  ...metaRoutes,
  ...siteRoutes,
  ...crewRoutes,
  ...invitationRoutes,
  ...draftRoutes,
  ...setAsideRoutes,
  ...revisionRoutes,
  ...sheetRoutes,
  ...solveRoutes,
  ...mailRoutes,
];
