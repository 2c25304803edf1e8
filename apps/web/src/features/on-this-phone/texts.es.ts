import type { OnThisPhoneTexts } from './texts.en';

const es: OnThisPhoneTexts = {
  title: 'En este teléfono',
  nothing: 'Nada espera en este teléfono. Todo está en la oficina.',
  waiting: '{{entries}} anotaciones y {{photos}} fotos esperan, {{size}}',
  since: 'La más antigua desde {{when}}',
  lastContact: 'Último contacto con la oficina {{when}}',
  neverContact: 'Aún sin contacto con la oficina',
  signInAgain: 'Entrar otra vez',
  deliverNow: 'Enviar ahora',
  delivering: 'Enviando',
  exportAll: 'Guardar una copia del registro de este teléfono',
  standings: {
    'on-this-phone': 'guardado en este teléfono',
    'on-its-way': 'en camino',
    'with-the-office': 'en la oficina',
    held: 'retenido: la oficina lo revisa',
  },
  reasons: {
    'no-network': 'No se llega a la oficina. Sigue solo.',
    'captive-portal': 'Esta red pide su propio registro antes de dejar pasar algo.',
    'sign-in': 'El envío sigue, pero para leer hay que entrar otra vez.',
    'server-busy': 'La oficina está ocupada. Sigue solo.',
    'server-fault': 'La oficina tiene una falla. Nada se pierde, sigue solo.',
    'device-revoked': 'La oficina retiró este teléfono. Guarde una copia y llame a la oficina.',
    fork: 'Este teléfono es copia de otro. Guarde una copia y llame a la oficina.',
    unknown: 'No sigue. Guarde una copia y llame a la oficina.',
  },
  photograph: 'Foto',
  entry: 'Anotación',
  storage: '{{used}} de {{quota}} en uso',
  notPersisted:
    'El navegador puede borrar esta memoria cuando se llene. Instale la aplicación en la pantalla de inicio para evitarlo.',
  persisted: 'El navegador conserva esta memoria.',
};
export default es;
