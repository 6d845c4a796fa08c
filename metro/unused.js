/**
 * What libraries bring along and no page of ours uses. Each entry: a pattern over the module's path inside node_modules.
 * `names`: what may then not be imported from the library (eslint.config.mjs enforces it).
 */
const nativeParts = [
  'ActivityIndicator', 'Alert', 'Animated', 'Button', 'CheckBox', 'FlatList', 'ImageBackground', 'PanResponder', 'Picker', 'ProgressBar',
  'RefreshControl', 'SectionList', 'Share', 'StatusBar', 'Switch', 'TouchableHighlight', 'TouchableNativeFeedback', 'TouchableOpacity',
  'TouchableWithoutFeedback', 'Vibration', 'VirtualizedList', 'LogBox', 'YellowBox',
];

module.exports = [
  {
    library: 'react-native',
    names: nativeParts,
    pattern: new RegExp(`^react-native-web/dist/exports/(${nativeParts.join('|')})/`),
  },
  {
    // Routes are drawn by <Slot>; there are no stacks, tabs, headers or previews.
    library: 'expo-router',
    names: ['Stack', 'Tabs', 'ExperimentalStack', 'Sitemap', 'Unmatched', 'ErrorBoundary'],
    pattern: new RegExp(`^expo-router/build/(${[
      'layouts/Tabs', 'layouts/experimental-stack/', 'layouts/stack-utils/', 'fork/native-stack/', 'react-navigation/(native-stack|bottom-tabs|elements)/',
      'views/(Sitemap|Unmatched|ErrorBoundary)\\.', 'native-tabs/', 'link/LinkWithPreview', 'link/preview/HrefPreview', 'onboard/',
    ].join('|')})`),
  },
  { library: 'react-native-screens', names: [], pattern: /^react-native-screens\// },
  {
    // Our words are our own, in English; schemas become JSON Schema on the server, and compiling them needs `new Function`.
    library: 'zod',
    names: [],
    pattern: /^zod\/v4\/(locales\/index\.|core\/(compile|json-schema-processors|json-schema-generator|to-json-schema)\.|classic\/from-json-schema\.)/,
  },
];
