// The router sets these switches when it starts; there are no native screens that would read them.
export const initScreensFeatureFlags = () => {};
