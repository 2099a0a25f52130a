import { ResetScreen } from '../../canvas/panels/auth/ResetScreen';

export default function ResetRoute() {
  return <ResetScreen />;
}
