import { SignUpScreen } from '../../canvas/panels/shell/lazyScreens';

export default function SignUpRoute() {
  return <SignUpScreen />;
}
