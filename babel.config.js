// The compiler's memory of every value doubles the code of a view: it is kept to the views that are drawn again under the finger.
const UNDER_THE_FINGER = /[\\/]canvas[\\/](?:figures|panels[\\/]plan)[\\/]/;

module.exports = function configure(api) {
  api.cache(true);
  return {
    presets: [
      [
        'babel-preset-expo',
        {
          worklets: false,
          reanimated: false,
          'react-compiler': { sources: (file) => UNDER_THE_FINGER.test(file) },
        },
      ],
    ],
    plugins: [['react-native-worklets/plugin', { omitNativeOnlyData: true, substituteWebPlatformChecks: true }]],
  };
};
