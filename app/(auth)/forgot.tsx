import { ForgotScreen } from '../../canvas/panels/auth/ForgotScreen';

export default function ForgotRoute() {
  return <ForgotScreen />;
}
