import { Redirect, useLocalSearchParams } from 'expo-router';

export default function SiteRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <Redirect href={{ pathname: '/sites/[siteId]/plan', params: { siteId } }} />;
}
