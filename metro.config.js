const http = require('node:http');
const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);

/** Builds, and the caches and cluster of a user's start, are nothing to bundle from. */
const here = __dirname.replace(/[^\w/]/g, '\\$&');
config.resolver.blockList = [new RegExp(`^${here}/(dist|\\.local)/`)];

/** zod brings forty languages of error messages; the contract has its own words. */
const zodLocales = path.join('zod', 'v4', 'locales', 'index.');

config.resolver.resolveRequest = (context, moduleName, platform) => {
  const found = context.resolveRequest(context, moduleName, platform);
  if (found.type !== 'sourceFile' || !found.filePath.includes(zodLocales)) return found;
  return { ...found, filePath: found.filePath.replace(/index(\.[a-z]+)$/, 'en$1') };
};

/** In development the app calls the API on its own origin, as it does in production. */
const ofApi = /^\/(v1|docs|problems)(\/|$|\?)|^\/(openapi\.json|livez|readyz)($|\?)/;

const proxyTo = (apiUrl) => (metro) => (request, response, next) => {
  if (!ofApi.test(request.url)) return metro(request, response, next);
  const { method, headers } = request;
  const call = http.request(new URL(request.url, apiUrl), { method, headers }, (answer) => {
    response.writeHead(answer.statusCode, answer.headers);
    answer.pipe(response);
  });
  call.on('error', (error) => {
    response.writeHead(502, { 'Content-Type': 'text/plain' });
    response.end(`The API at ${apiUrl} does not answer: ${error.message}\n`);
  });
  return request.pipe(call);
};

const { API_URL } = process.env;
if (API_URL) config.server.enhanceMiddleware = proxyTo(API_URL);

module.exports = config;
