import type { SettingsTexts } from './texts.en';

const es: SettingsTexts = {
  title: 'Ajustes',
  language: 'Idioma',
  mode: 'Pantalla',
  modes: { paper: 'Papel: de día', night: 'Noche: antes del alba', sun: 'Sol: con reflejo' },
  keys: 'Teclas en las pantallas de oficina',
  keysOn: 'Sí',
  keysOff: 'No',
  signedIn: 'Ha entrado {{name}}, {{company}}',
};
export default es;
