const en = {
  title: 'Settings',
  language: 'Language',
  mode: 'Display',
  modes: { paper: 'Paper: by day', night: 'Night: before dawn', sun: 'Sun: glare' },
  keys: 'Keys on desk screens',
  keysOn: 'On',
  keysOff: 'Off',
  signedIn: 'Signed in as {{name}}, {{company}}',
};
export type SettingsTexts = typeof en;
export default en;
