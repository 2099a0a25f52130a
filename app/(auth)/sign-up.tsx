import { SignUpScreen } from '../../canvas/panels/auth/SignUpScreen';

export default function SignUpRoute() {
  return <SignUpScreen />;
}
