import { Stack } from 'expo-router';
import { Providers } from '../canvas/panels/shell/Providers';
import { WaitForSession } from '../canvas/panels/shell/WaitForSession';
import { ScreenBroke } from '../canvas/panels/shell/ScreenBroke';

export function ErrorBoundary(props: { error: Error; retry: () => Promise<void> }) {
  return <ScreenBroke {...props} />;
}

export default function RootLayout() {
  return (
    <Providers>
      <WaitForSession>
        {(signedIn) => (
          <Stack screenOptions={{ headerShown: false, animation: 'none' }}>
            <Stack.Protected guard={signedIn}>
              <Stack.Screen name="(site)" />
            </Stack.Protected>
            <Stack.Protected guard={!signedIn}>
              <Stack.Screen name="(auth)/sign-in" />
              <Stack.Screen name="(auth)/sign-up" />
              <Stack.Screen name="(auth)/forgot" />
            </Stack.Protected>
            <Stack.Screen name="(auth)/reset" />
            <Stack.Screen name="(auth)/invitation/[token]" />
            <Stack.Screen name="(auth)/mail" />
            <Stack.Screen name="+not-found" />
          </Stack>
        )}
      </WaitForSession>
    </Providers>
  );
}
