import { SignInScreen } from '../../canvas/panels/shell/lazyScreens';

export default function SignInRoute() {
  return <SignInScreen />;
}
