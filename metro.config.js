const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);
const folder = (name) => new RegExp(`^${path.join(__dirname, name).replace(/[/\\.]/g, '[/\\\\.]')}[/\\\\]`);

config.resolver.assetExts.push('woff2');
config.resolver.blockList = [config.resolver.blockList].flat().concat(['tests', 'server', 'simulation', 'dist', '.local', 'coverage', '.git'].map(folder));

/** zod carries its messages in some fifty languages; the client speaks one. */
const zodEnglish = path.join(__dirname, 'assets/zod-locales.js');
const resolveAsUsual = config.resolver.resolveRequest;
config.resolver.resolveRequest = (context, name, platform) => {
  if (name === '../locales/index.js' && /[/\\]zod[/\\]v4[/\\]/.test(context.originModulePath)) return { type: 'sourceFile', filePath: zodEnglish };
  return (resolveAsUsual ?? context.resolveRequest)(context, name, platform);
};

module.exports = config;
