import { ResetScreen } from '../../canvas/panels/shell/lazyScreens';

export default function ResetRoute() {
  return <ResetScreen />;
}
