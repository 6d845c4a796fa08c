const { getDefaultConfig } = require('expo/metro-config');
const path = require('node:path');

const config = getDefaultConfig(__dirname);

config.resolver.assetExts.push('woff2');
// Servers, rules and tests have no business in a bundle, and watching them costs time.
config.resolver.blockList = [/\/(server|pricing|tests|dist|\.data)\/.*/].map(
  (pattern) => new RegExp(`^${path.join(__dirname).replace(/[.*+?^${}()|[\]\\]/g, '\\$&')}${pattern.source}`),
);

// zod brings some forty languages (277 KB) along with its errors; our words are our own.
const zodLocales = /^\.\.\/locales\/index\.(js|cjs)$/;
// In the browser SVG needs no library: see that file.
const leanSvg = path.join(__dirname, 'components/drawings/svg.web.tsx');
config.resolver.resolveRequest = (context, moduleName, platform) => {
  if (platform === 'web' && moduleName === 'react-native-svg') return { type: 'sourceFile', filePath: leanSvg };
  if (zodLocales.test(moduleName) && /[\\/]node_modules[\\/]zod[\\/]v4[\\/]/.test(context.originModulePath)) return { type: 'empty' };
  return context.resolveRequest(context, moduleName, platform);
};

module.exports = config;
