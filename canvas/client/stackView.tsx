/**
 * Stands in for the router's own view of a stack on the web, which brings headers, animation and half of React Native for
 * them: our screens have a header of their own. As there, every screen of the stack stays, and only the last is shown.
 */
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

interface Stack {
  readonly state: { readonly index: number; readonly routes: readonly { readonly key: string }[] };
  readonly descriptors: Readonly<Record<string, { readonly render: () => ReactNode }>>;
}

export function NativeStackView({ state, descriptors }: Stack) {
  return state.routes.map(({ key }, i) => (
    <View key={key} aria-hidden={i !== state.index} style={[styles.screen, i === state.index ? null : styles.under]}>
      {descriptors[key]?.render()}
    </View>
  ));
}

const styles = StyleSheet.create({
  screen: { position: 'absolute', left: 0, top: 0, right: 0, bottom: 0 },
  under: { display: 'none' },
});
