/** An empty Expo Router page, exported by the same tools as ours: what any first load costs before a line of the product. */
import { execFileSync } from 'node:child_process';
import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { expoEnvironment } from '../../server/launch/client.mjs';
import { CHECKOUT } from '../../server/launch/state.mjs';

const FILES: Record<string, string> = {
  'package.json': JSON.stringify({ name: 'empty', version: '0.0.0', private: true, main: 'expo-router/entry' }),
  'app.json': JSON.stringify({
    expo: {
      name: 'Empty',
      slug: 'empty',
      scheme: 'empty',
      platforms: ['web'],
      web: { bundler: 'metro', output: 'single' },
      plugins: [['expo-router', { asyncRoutes: { web: 'production', default: 'development' } }]],
      experiments: { reactCompiler: true },
    },
  }),
  'babel.config.js': "module.exports = require('../../babel.config.js');\n",
  'metro.config.js': `
    const path = require('node:path');
    const { getDefaultConfig } = require('expo/metro-config');
    const config = getDefaultConfig(__dirname);
    config.watchFolders = [path.resolve(__dirname, '../../node_modules')];
    config.resolver.nodeModulesPaths = [path.resolve(__dirname, '../../node_modules')];
    const { FileStore } = require('metro-cache');
    config.cacheStores = [new FileStore({ root: path.resolve(__dirname, '../../node_modules/.cache/metro-empty') })];
    module.exports = config;
  `,
  'app/index.tsx': `
    import { Text } from 'react-native';
    export default function Empty() {
      return <Text>Empty</Text>;
    }
  `,
};

/** Exports it and answers with the folder. */
export function exportEmptyApp(): string {
  const folder = path.join(CHECKOUT, '.state', 'empty-app');
  rmSync(folder, { recursive: true, force: true });
  for (const [name, text] of Object.entries(FILES)) {
    mkdirSync(path.dirname(path.join(folder, name)), { recursive: true });
    writeFileSync(path.join(folder, name), text);
  }
  execFileSync(path.join(CHECKOUT, 'node_modules/.bin/expo'), ['export', '--platform', 'web', '--output-dir', 'dist'], {
    cwd: folder,
    env: { ...process.env, ...expoEnvironment(), CI: '1' },
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  return path.join(folder, 'dist');
}
