import { useLocalSearchParams } from 'expo-router';
import { InvitationScreen } from '../../../canvas/panels/auth/InvitationScreen';

export default function InvitationRoute() {
  const { token } = useLocalSearchParams<{ token: string }>();
  return <InvitationScreen token={token} />;
}
