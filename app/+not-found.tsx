import { NoSuchPage } from '../canvas/panels/shell/NoSuchPage';

export default function NotFoundRoute() {
  return <NoSuchPage />;
}
