/** Jest runs CommonJS, where what is loaded when needed is a `require` put off. */
const deferredRequire = ({ template }) => ({
  visitor: {
    Import({ parentPath }) {
      parentPath.replaceWith(template.expression.ast`Promise.resolve().then(() => require(${parentPath.node.arguments[0]}))`);
    },
  },
});

module.exports = (api) => {
  const test = api.env('test');
  return { presets: ['babel-preset-expo'], plugins: test ? [deferredRequire] : [] };
};
