const { getDefaultConfig } = require('expo/metro-config');
const { request } = require('node:http');

const config = getDefaultConfig(__dirname);

// `npm run dev`: the dev server passes on what is the API's, so that both are one origin and
// cookies work as they do in the built product.
const api = process.env.SCANTLING_API ? new URL(process.env.SCANTLING_API) : null;
const mail = process.env.SCANTLING_MAIL ? new URL(process.env.SCANTLING_MAIL) : api;

function passOn(incoming, outgoing) {
  const { method, url: path, headers } = incoming;
  const { hostname, port } = path.startsWith('/local') ? mail : api;
  const onward = request({ host: hostname, port, method, path, headers }, (answer) => {
    outgoing.writeHead(answer.statusCode, answer.headers);
    answer.pipe(outgoing);
  });
  onward.on('error', () => {
    if (!outgoing.headersSent) outgoing.writeHead(502, { 'Content-Type': 'text/plain' });
    outgoing.end('The API does not answer yet. Try again in a moment.');
  });
  incoming.pipe(onward);
}

if (api !== null) {
  config.server = {
    ...config.server,
    enhanceMiddleware: (metro) => (incoming, outgoing, next) =>
      /^\/(api|media|local)(\/|\?|$)/.test(incoming.url ?? '')
        ? passOn(incoming, outgoing)
        : metro(incoming, outgoing, next),
  };
}

// zod's entry names fifty languages of error messages; ours are written here, so they stay out (350 kB).
const resolve = config.resolver.resolveRequest;
config.resolver.resolveRequest = (context, name, platform) =>
  /locales\/index\.c?js$/.test(name) && /\/node_modules\/zod\//.test(context.originModulePath)
    ? { type: 'empty' }
    : (resolve ?? context.resolveRequest)(context, name, platform);

module.exports = config;
