const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);
const here = path.resolve(__dirname).replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

// Data of the local database and built files of this project are no source: watching them would
// be slow. Only at its root: packages ship their code in folders called dist, too.
config.resolver.blockList = [
  new RegExp(`^${here}/(\\.data|dist|coverage|reports|\\.stryker-tmp)/.*`),
];

module.exports = config;
