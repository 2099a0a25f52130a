const http = require('node:http');
const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');
const { FileStore } = require('metro-cache');

const config = getDefaultConfig(__dirname);

// A cache of this checkout's own: the default is a shared temporary folder that a second user cannot write to.
config.cacheStores = [new FileStore({ root: path.join(__dirname, 'node_modules/.cache/metro') })];

// What packages bring along and nothing of ours calls, by who asks for it: zod's locales (about 400 kB; people read our own
// words), its JSON Schemas and its compiler (the content security policy forbids it), and the router's tab bars
// and its page of all routes.
const standIns = [
  { from: /[\\/]zod[\\/]v4[\\/]/, name: /locales\/index\.c?js$/, file: 'canvas/client/zodEnglish.ts' },
  {
    from: /[\\/]zod[\\/]v4[\\/]/,
    name: /\/(?:json-schema-processors|json-schema-generator|to-json-schema|from-json-schema|compile|deep-partial|in-out)\.c?js$/,
    file: 'canvas/client/zodWithout.ts',
  },
  {
    from: /[\\/]expo-router[\\/]build[\\/](?:exports|getRoutes|ExpoRoot|views[\\/]ErrorBoundary|views[\\/]Toast)\.js$/,
    name: /\/(?:layouts\/Tabs|layouts\/experimental-stack|react-navigation\/bottom-tabs|views\/Sitemap|views\/Unmatched)$/,
    file: 'canvas/client/routerWithout.ts',
  },
];
config.resolver.resolveRequest = (context, moduleName, platform) => {
  const standIn = standIns.find(({ from, name }) => from.test(context.originModulePath) && name.test(moduleName));
  if (standIn) return { type: 'sourceFile', filePath: path.join(__dirname, standIn.file) };
  return context.resolveRequest(context, moduleName, platform);
};

// Our own build and state folders are not watched; packages keep their dist folders, where their code lies.
const own = (folder) => new RegExp('^' + path.join(__dirname, folder).replace(/[^A-Za-z0-9]/g, '\\$&') + '[\\\\/].*');
config.resolver.blockList = [own('.state'), own('dist')];

module.exports = config;
