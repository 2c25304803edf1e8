import type { TodayTexts } from './texts.en';

const es: TodayTexts = {
  title: 'Hoy',
  noStops: 'No hay paradas para este día en este teléfono.',
  ready: 'Listo para el día: todas las paradas están en este teléfono',
  notReady: 'Todavía falta algo en este teléfono. Deje la aplicación abierta con señal.',
  neverPulled: 'Este teléfono aún no se ha comunicado con la oficina. Conéctelo una vez para traer el día.',
  stop: 'Parada {{sequence}}',
  sentBack: 'Devuelta: {{count}} preguntas',
  sentBack_one: 'Devuelta: {{count}} pregunta',
  standing: {
    untouched: 'por hacer',
    started: 'empezada',
    left: 'hecha',
    answered: 'respondida',
    accepted: 'aceptada',
    'sent-back': 'devuelta',
    'return-visit': 'hay que volver',
  },
  purpose: { winterize: '', 'return-visit': 'Segunda visita', spring: 'Visita de primavera' },
  zones: '{{count}} zonas',
  zones_one: '{{count}} zona',
  earlier: 'El día anterior',
  later: 'El día siguiente',
  today: 'Hoy',
  onThisPhone: 'En este teléfono',
  next: 'Próxima parada: {{site}}',
  dayDone: 'El día está hecho',
  waiting: '{{count}} anotaciones esperan en este teléfono',
  waiting_one: '{{count}} anotación espera en este teléfono',
  allDelivered: 'Todo está en la oficina',
};
export default es;
