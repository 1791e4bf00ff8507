const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);
// Metro does not know woff2; the web target ships Barlow in it (a third of the size of the TTF).
config.resolver.assetExts.push('woff2');
// Data of the local database and built files are no source: watching them would be slow.
config.resolver.blockList = [/\/\.data\/.*/, /\/dist\/.*/, /\/\.stryker-tmp\/.*/];

module.exports = config;
