import { Stack } from 'expo-router';
import { useGoOn } from '../../canvas/panels/auth/useGoOn';

export const unstable_settings = { initialRouteName: 'index' };

export default function SiteGroupLayout() {
  useGoOn();
  return <Stack screenOptions={{ headerShown: false, animation: 'none' }} />;
}
