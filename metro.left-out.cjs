// What the web client leaves out of the packages it is built on, as data: metro.config.js answers each of these files
// with a stand-in (a file of stand-ins/). A part goes here when no screen shows it, however it is reached; when one is
// needed after all, using it fails with a sentence that leads here, and its line goes. A test holds that each file
// exists, so that an upgrade which moves one is noticed (docs/decisions/0010).

const neverShown = 'left-out.js';

module.exports = [
  {
    package: 'react-native-svg',
    reason:
      'On the web a drawing is an element of the page: its own parser of shapes and transforms is not needed.',
    standIn: 'svg.tsx',
    files: ['lib/module/index.js'],
  },
  {
    package: 'zod',
    reason: 'Schemas are written as JSON Schema by the server alone, for its description of the endpoints.',
    standIn: neverShown,
    files: [
      'v4/core/json-schema-processors.js',
      'v4/core/json-schema-generator.js',
      'v4/core/to-json-schema.js',
      'v4/classic/from-json-schema.js',
    ],
  },
  {
    package: 'zod',
    reason: 'Compiling a schema makes code from text, which the policy of the page forbids.',
    standIn: neverShown,
    files: ['v4/core/compile.js'],
  },
  {
    package: 'zod',
    reason: 'Schemas are not rewritten: each is declared once, in a contract.',
    standIn: neverShown,
    files: ['v4/core/visit.js', 'v4/classic/deep-partial.js', 'v4/classic/in-out.js'],
  },
  {
    package: 'uuid',
    reason: 'Ids are made by version 7 alone.',
    standIn: neverShown,
    files: ['md5', 'parse', 'sha1', 'v1', 'v1ToV6', 'v3', 'v35', 'v4', 'v5', 'v6', 'v6ToV1', 'version'].map(
      (name) => `dist/esm-browser/${name}.js`,
    ),
  },
  {
    package: 'react-native-web',
    reason:
      'Screens are elements of the page (decision 0003); of this package they use text, boxes and the width.',
    standIn: neverShown,
    files: [
      'AccessibilityInfo',
      'ActivityIndicator',
      'Animated',
      'AppState',
      'Button',
      'CheckBox',
      'Clipboard',
      'Easing',
      'FlatList',
      'Image',
      'ImageBackground',
      'InteractionManager',
      'KeyboardAvoidingView',
      'LayoutAnimation',
      'Linking',
      'Modal',
      'PanResponder',
      'Picker',
      'Pressable',
      'ProgressBar',
      'RefreshControl',
      'SafeAreaView',
      'ScrollView',
      'SectionList',
      'Share',
      'Switch',
      'TextInput',
      'Touchable',
      'TouchableHighlight',
      'TouchableNativeFeedback',
      'TouchableOpacity',
      'TouchableWithoutFeedback',
      'VirtualizedList',
    ].map((name) => `dist/exports/${name}/index.js`),
  },
  {
    package: 'expo-router',
    reason: 'Addresses are nested by Slot alone: no stack with headers, no tabs, no drawer.',
    standIn: neverShown,
    files: [
      'build/layouts/Stack.web.js',
      'build/layouts/Tabs.js',
      'build/layouts/experimental-stack/index.web.js',
      'build/layouts/stack-utils/index.js',
      'build/native-tabs/NativeTabTrigger.js',
      'build/react-navigation/bottom-tabs/index.js',
      'build/react-navigation/routers/DrawerRouter.js',
      'build/react-navigation/routers/TabRouter.js',
      'build/standard-navigation/index.js',
    ],
  },
  {
    package: 'expo-router',
    reason: 'The stack that the router makes when it starts, and never shows.',
    standIn: 'native-stack.js',
    files: ['build/fork/native-stack/createNativeStackNavigator.js'],
  },
  {
    package: 'expo-router',
    reason: 'Switches of a package for native screens, which are not there.',
    standIn: 'screen-flags.js',
    files: ['build/screensFeatureFlags.js'],
  },
  {
    package: 'expo-router',
    reason: 'Screens write the title of the page themselves.',
    standIn: 'head.js',
    files: ['build/head/index.js'],
  },
  {
    package: 'expo-router',
    reason:
      "The router's own pages: a map of all addresses, nothing found (ours is app/+not-found), an error's stack.",
    standIn: neverShown,
    files: [
      'build/color/index.js',
      'build/views/ErrorBoundary.js',
      'build/views/Pressable.js',
      'build/views/Sitemap.js',
      'build/views/Toast.js',
      'build/views/Unmatched.js',
      'build/views/useSitemap.js',
    ],
  },
  {
    package: 'expo-router',
    reason: 'Peeking at what a link leads to is a touch of the phone, not of the browser.',
    standIn: neverShown,
    files: [
      'build/link/LinkWithPreview.js',
      'build/link/elements.js',
      'build/link/zoom/link-apple-zoom.js',
      'build/link/zoom/link-apple-zoom-target.js',
    ],
  },
  {
    package: 'expo-router',
    reason:
      'Twins of parts that the router has in a version of its own (build/fork), or a static way to declare pages.',
    standIn: neverShown,
    files: [
      'build/react-navigation/core/StaticNavigation.js',
      'build/react-navigation/core/getActionFromState.js',
      'build/react-navigation/core/getPathFromState.js',
      'build/react-navigation/core/getStateFromPath.js',
      'build/react-navigation/native/Link.js',
      'build/react-navigation/native/NavigationContainer.js',
      'build/react-navigation/native/ServerContainer.js',
      'build/react-navigation/native/createStaticNavigation.js',
      'build/react-navigation/native/useLinkBuilder.js',
      'build/react-navigation/native/useLinkProps.js',
      'build/react-navigation/native/useLinkTo.js',
      'build/react-navigation/native/useScrollToTop.js',
    ],
  },
];
