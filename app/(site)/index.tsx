import { SitesScreen } from '../../canvas/panels/sites/SitesScreen';

export default function SitesRoute() {
  return <SitesScreen />;
}
