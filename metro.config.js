const http = require('node:http');
const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');
const { FileStore } = require('metro-cache');

const config = getDefaultConfig(__dirname);

// A cache of this checkout's own: the default is a shared temporary folder that a second user cannot write to.
config.cacheStores = [new FileStore({ root: path.join(__dirname, 'node_modules/.cache/metro') })];

// zod ships about 400 kB of locales; English alone is enough, because people read our own words.
const zodLocales = /zod[\\/]v4[\\/](core[\\/]\.\.[\\/])?/;
config.resolver.resolveRequest = (context, moduleName, platform) => {
  if (/locales\/index\.c?js$/.test(moduleName) && zodLocales.test(context.originModulePath)) {
    return { type: 'sourceFile', filePath: path.join(__dirname, 'canvas/client/zodEnglish.ts') };
  }
  return context.resolveRequest(context, moduleName, platform);
};

// In development the API answers at the page's own origin.
const apiPort = process.env.API_PORT;
if (apiPort) {
  config.server.enhanceMiddleware = (metro) => (request, response, next) => {
    if (!request.url?.startsWith('/api/')) return metro(request, response, next);
    const { method, headers, url } = request;
    const onward = http.request({ host: '127.0.0.1', port: Number(apiPort), method, headers, path: url }, (answer) => {
      response.writeHead(answer.statusCode ?? 502, answer.headers);
      answer.pipe(response);
    });
    onward.once('error', () => response.writeHead(502).end());
    request.pipe(onward);
  };
}

// Only what the client uses is watched.
config.resolver.blockList = [/[\\/]\.state[\\/].*/, /[\\/]dist[\\/].*/];

module.exports = config;
