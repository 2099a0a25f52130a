const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');
const { FileStore } = require('metro-cache');
const { withSerializerPlugins } = require('@expo/metro-config/build/serializer/withExpoSerializers');
const environment = require('@expo/metro-config/build/serializer/environmentVariableSerializerPlugin');
const { treeShakeSerializer } = require('@expo/metro-config/build/serializer/treeShakeSerializerPlugin');
const {
  reconcileTransformSerializerPlugin,
} = require('@expo/metro-config/build/serializer/reconcileTransformSerializerPlugin');

const config = getDefaultConfig(__dirname);

// A cache of this checkout's own: the default is a shared temporary folder that a second user cannot write to.
config.cacheStores = [new FileStore({ root: path.join(__dirname, 'node_modules/.cache/metro') })];

// What packages bring along and nothing of ours reaches, by who asks for it. Each stand-in says so if it is reached after all.
const standIns = [
  // zod's locales (about 400 kB; people read our own words), its JSON Schemas, and its compiler (the content security policy forbids it).
  { from: /[\\/]zod[\\/]v4[\\/]/, name: /locales\/index\.c?js$/, file: 'canvas/client/zodEnglish.ts' },
  {
    from: /[\\/]zod[\\/]v4[\\/]/,
    name: /\/(?:json-schema-processors|json-schema-generator|to-json-schema|from-json-schema|compile|deep-partial|in-out)\.c?js$/,
    file: 'canvas/client/zodWithout.ts',
  },
  // The router's tab bars, tool bars, link previews and zooms, its page of all routes, and the navigation that it replaced by its own.
  {
    from: /[\\/]expo-router[\\/]build[\\/](?:exports|index|getRoutes|ExpoRoot|views[\\/]\w+|layouts[\\/].*|link[\\/]\w+)\.js$/,
    name: /\/(?:layouts\/Tabs|layouts\/experimental-stack|react-navigation\/bottom-tabs|views\/Sitemap|views\/Unmatched|Unmatched|standard-navigation|color|native-tabs\/NativeTabTrigger|toolbar|StackSearchBar|LinkWithPreview|elements|link-apple-zoom|link-apple-zoom-target)$/,
    file: 'canvas/client/routerWithout.ts',
  },
  {
    from: /[\\/]expo-router[\\/]build[\\/]react-navigation[\\/](?:native|core|routers)[\\/]index\.js$/,
    name: /\/(?:createStaticNavigation|StaticNavigation|Link|NavigationContainer|ServerContainer|useLinkBuilder|useLinkProps|useLinkTo|getStateFromPath|getPathFromState|DrawerRouter|TabRouter)$/,
    file: 'canvas/client/routerWithout.ts',
  },
  {
    from: /[\\/]expo-router[\\/]build[\\/]screensFeatureFlags\.js$/,
    name: /^react-native-screens$/,
    file: 'canvas/client/routerWithout.ts',
  },
  {
    from: /[\\/]react-navigation[\\/]native-stack[\\/]/,
    name: /\/views\/NativeStackView$/,
    file: 'canvas/client/stackView.tsx',
  },
  // The router asks for the whole of React Native; in development its own notices use some of this.
  {
    built: true,
    from: /[\\/]react-native-web[\\/]dist[\\/]index\.js$/,
    name: /\/exports\/(?:Alert|Animated|Button|CheckBox|Clipboard|FlatList|ImageBackground|InputAccessoryView|InteractionManager|KeyboardAvoidingView|LayoutAnimation|Modal|PanResponder|Picker|ProgressBar|RefreshControl|SafeAreaView|SectionList|Share|Switch|Touchable\w*|Vibration|VirtualizedList|YellowBox)$/,
    file: 'canvas/client/nativeWithout.ts',
  },
  {
    built: true,
    from: /[\\/]react-native-gesture-handler[\\/].*[\\/]findNodeHandle\.web\.js$/,
    name: /\/exports\/FlatList$|FlatList\/index/,
    file: 'canvas/client/nativeWithout.ts',
  },
  // Reanimated's entering, leaving and changing places, animations written as styles, and animated kinds of views besides the plain one.
  {
    from: /[\\/]react-native-reanimated[\\/]lib[\\/]module[\\/](?:Animated|initializers|createAnimatedComponent[\\/]AnimatedComponent|css[\\/]component[\\/]AnimatedComponent)\.js$/,
    name: /\/(?:component\/(?:FlatList|Image|ScrollView|Text)\.js|css\/svg\/index\.js|layoutReanimation\/(?:web\/index|web\/domUtils|SharedTransition)\.js|platform)$/,
    file: 'canvas/client/motionWithout.ts',
  },
  // Gesture handler asks for reanimated to run gestures as worklets; ours run in plain JavaScript, which it does without.
  {
    from: /[\\/]react-native-gesture-handler[\\/].*[\\/]reanimatedWrapper\.js$/,
    name: /^react-native-reanimated$/,
    file: 'canvas/client/gesturesWithout.ts',
  },
  // Its older web implementation, which has to be asked for, and the gestures besides the one that we use.
  {
    from: /[\\/]react-native-gesture-handler[\\/].*[\\/](?:web[\\/]Gestures|RNGestureHandlerModule\.web)\.js$/,
    name: /\/web_hammer\/|\/handlers\/(?!Manual)\w+GestureHandler$/,
    file: 'canvas/client/gesturesWithout.ts',
  },
];
config.resolver.resolveRequest = (context, moduleName, platform) => {
  const standIn = standIns.find(
    ({ from, name, built }) => from.test(context.originModulePath) && name.test(moduleName) && !(built && context.dev),
  );
  if (standIn) return { type: 'sourceFile', filePath: path.join(__dirname, standIn.file) };
  return context.resolveRequest(context, moduleName, platform);
};

/**
 * Chunks that are only ever loaded after others. What they share with those stays there: Expo would move it into the
 * page's first load, as it does with whatever two chunks share.
 */
const LATER = [
  {
    chunk: 'canvas/panels/shell/otherScreens.ts',
    after: ['canvas/panels/shell/planScreens.ts', 'canvas/panels/shell/formScreens.ts'],
  },
];
const LENT = 'lent:';

/** The modules that come along with one: all that it imports, and what those import, but not what they import() when needed. */
function withImports(graph, start) {
  const found = new Set();
  const open = [start];
  while (open.length > 0) {
    const module = graph.dependencies.get(open.pop());
    if (!module || found.has(module)) continue;
    found.add(module);
    for (const { absolutePath, data } of module.dependencies.values()) {
      if (absolutePath && !data.data.asyncType) open.push(absolutePath);
    }
  }
  return found;
}

/** Where chunks start: the page's entry and every import(). */
function chunkStarts(entryPoint, graph) {
  const starts = new Set([entryPoint]);
  for (const module of graph.dependencies.values()) {
    for (const { absolutePath, data } of module.dependencies.values()) {
      if (absolutePath && data.data.asyncType) starts.add(absolutePath);
    }
  }
  return starts;
}

/** Hides from the splitting of chunks the imports by which a later chunk reaches into one that is there before it. */
function lendToLaterChunks(entryPoint, preModules, graph, options) {
  if (options.dev) return [entryPoint, preModules, graph, options];
  const starts = chunkStarts(entryPoint, graph);
  for (const { chunk, after } of LATER) {
    const later = path.join(__dirname, chunk);
    if (!starts.has(later)) continue;
    const before = new Set(after.flatMap((one) => [...withImports(graph, path.join(__dirname, one))]));
    const others = new Set(
      [...starts].filter((start) => start !== later).flatMap((start) => [...withImports(graph, start)]),
    );
    for (const module of withImports(graph, later)) {
      if (others.has(module)) continue;
      for (const [key, dependency] of module.dependencies) {
        if (dependency.data.data.asyncType || !before.has(graph.dependencies.get(dependency.absolutePath))) continue;
        module.dependencies.set(key, { ...dependency, absolutePath: LENT + dependency.absolutePath });
      }
    }
  }
  const createModuleId = (modulePath, ...rest) => options.createModuleId(modulePath.replace(LENT, ''), ...rest);
  return [entryPoint, preModules, graph, { ...options, createModuleId }];
}

// Expo's own steps in Expo's order, then ours: imports that tree shaking takes out are no longer there to be lent.
config.serializer.customSerializer = null;
withSerializerPlugins(config, [
  environment.serverPreludeSerializerPlugin,
  environment.environmentVariableSerializerPlugin,
  treeShakeSerializer,
  reconcileTransformSerializerPlugin,
  lendToLaterChunks,
]);

// Our own build and state folders are not watched; packages keep their dist folders, where their code lies.
const own = (folder) => new RegExp('^' + path.join(__dirname, folder).replace(/[^A-Za-z0-9]/g, '\\$&') + '[\\\\/].*');
config.resolver.blockList = [own('.state'), own('dist')];

module.exports = config;
