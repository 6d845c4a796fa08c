/** Only for Metro and jest; the server's TypeScript runs through tsx. */
module.exports = (api) => {
  api.cache(true);
  return { presets: ['babel-preset-expo'] };
};
