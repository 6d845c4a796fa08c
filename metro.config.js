const { getDefaultConfig } = require('expo/metro-config');
const path = require('node:path');
const unused = require('./metro/unused');

const config = getDefaultConfig(__dirname);
const nothing = path.join(__dirname, 'metro', 'nothing.js');

config.resolver.assetExts.push('woff2');
// Servers, rules and tests have no business in a bundle, and watching them costs time.
config.resolver.blockList = [/\/(server|pricing|tests|dist|\.data)\/.*/].map(
  (pattern) => new RegExp(`^${path.join(__dirname).replace(/[.*+?^${}()|[\]\\]/g, '\\$&')}${pattern.source}`),
);

// In the browser SVG needs no library: that file says more.
const leanSvg = path.join(__dirname, 'components/drawings/svg.web.tsx');

config.resolver.resolveRequest = (context, moduleName, platform) => {
  if (platform === 'web' && moduleName === 'react-native-svg') return { type: 'sourceFile', filePath: leanSvg };
  const found = context.resolveRequest(context, moduleName, platform);
  if (found.type !== 'sourceFile') return found;
  const inLibrary = found.filePath.split(`${path.sep}node_modules${path.sep}`).at(-1).split(path.sep).join('/');
  return unused.some(({ pattern }) => pattern.test(inLibrary)) ? { type: 'sourceFile', filePath: nothing } : found;
};

module.exports = config;
