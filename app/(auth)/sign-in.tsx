import { SignInScreen } from '../../canvas/panels/auth/SignInScreen';

export default function SignInRoute() {
  return <SignInScreen />;
}
