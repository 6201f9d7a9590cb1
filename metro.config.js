const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);

/** zod carries its messages in some fifty languages, 200 kB of code before the first screen; the app speaks one. */
config.resolver.resolveRequest = (context, name, platform) => {
  const allLanguages =
    name === '../locales/index.js' && /[\\/]node_modules[\\/]zod[\\/]/.test(context.originModulePath);
  return context.resolveRequest(context, allLanguages ? '../locales/en.js' : name, platform);
};

module.exports = config;
