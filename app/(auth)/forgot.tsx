import { ForgotScreen } from '../../canvas/panels/shell/lazyScreens';

export default function ForgotRoute() {
  return <ForgotScreen />;
}
