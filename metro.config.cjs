const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);
const here = path.resolve(__dirname).replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

// Data of the local database and built files of this project are no source: watching them would
// be slow. Only at its root: packages ship their code in folders called dist, too.
config.resolver.blockList = [
  new RegExp(`^${here}/(\\.data|dist|coverage|reports|\\.stryker-tmp)/.*`),
];

// Metro takes a package whole. Two of them hold much that this app never calls:
// zod its messages in fifty languages (ours come from shared/messages by the fault's code),
// and react-native-svg its reader of SVG files (ours are drawn as elements).
config.resolver.resolveRequest = (context, moduleName, platform) => {
  if (moduleName === '../locales/index.js' && /\/zod\/v4\//.test(context.originModulePath)) {
    return { type: 'empty' };
  }
  if (platform === 'web' && moduleName === 'react-native-svg') {
    const entry = require.resolve('react-native-svg/package.json');
    return {
      type: 'sourceFile',
      filePath: path.join(path.dirname(entry), 'lib/module/elements.web.js'),
    };
  }
  return context.resolveRequest(context, moduleName, platform);
};

module.exports = config;
