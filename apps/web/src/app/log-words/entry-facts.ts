import type { LogEntry, System } from '@rimeward/field-log';
import type { TFunction } from 'i18next';
import { clockText } from '../format/clock-text';
import type { LogTexts } from './texts.en';

type Words = TFunction<'log'>;
type Word = keyof LogTexts['words'];

/**
 * What an entry says beside its name, in a few words: zone, pressure, position, the technician's own text. Pressures are shown as
 * they were written, in psi.
 */
export function entryFacts(entry: LogEntry, system: System, t: Words): string {
  const word = (value: Word | null | undefined) => (value ? t(`words.${value}`) : '');
  const zone = (id: string | null) => {
    const found = system.zones.find((one) => one.id === id);
    return found ? t('facts.zone', { number: found.number }) : '';
  };
  const psi = (value: number | null) =>
    value === null ? '' : t('facts.psi', { pressure: `${Math.round(value)} psi` });
  const photos = entry.photos.length > 0 ? t('facts.photos', { count: entry.photos.length }) : '';
  return [...facts(), photos].filter(Boolean).join(' · ');

  function facts(): (string | undefined)[] {
    switch (entry.type) {
      case 'arrived':
        return [word(entry.body.removalMethod)];
      case 'damage-seen':
        return [entry.body.where, entry.body.what];
      case 'part-looked-for':
        return [word(entry.body.kind), word(entry.body.outcome), entry.body.note];
      case 'part-protected':
        return [word(entry.body.kind), word(entry.body.how), word(entry.body.keptWhere), entry.body.reason];
      case 'water-off':
        return [word(entry.body.kind), entry.body.note];
      case 'pressure-relieved':
        return [zone(entry.body.zoneId)];
      case 'valve-set':
        return [entry.body.valveId, word(entry.body.stage), word(entry.body.position), entry.body.note];
      case 'air-connected':
        return [word(entry.body.place)];
      case 'regulator-set':
        return [psi(entry.body.pressurePsi)];
      case 'interlock-passed':
        return [entry.body.interlock, entry.body.reason];
      case 'zone-opened':
      case 'zone-closed':
        return [zone(entry.body.zoneId)];
      case 'air-started':
        return [zone(entry.body.zoneId), psi(entry.body.gaugePsi)];
      case 'air-stopped':
        return [entry.body.elapsedMs === null ? '' : clockText(entry.body.elapsedMs)];
      case 'end-sign-seen':
        return [word(entry.body.sign)];
      case 'gauge-read':
        return [psi(entry.body.pressurePsi)];
      case 'heads-seen':
        return [zone(entry.body.zoneId), entry.body.what];
      case 'zone-skipped':
        return [zone(entry.body.zoneId), entry.body.reason];
      case 'air-closed-down':
        return [word(entry.body.step)];
      case 'drain-set':
        return [word(entry.body.position)];
      case 'pump-drained':
        return [t(entry.body.drained ? 'facts.yes' : 'facts.no')];
      case 'connection-plugged':
        return [t(entry.body.plugged ? 'facts.yes' : 'facts.no')];
      case 'controller-set':
        return [word(entry.body.mode)];
      case 'insulated':
        return [word(entry.body.what)];
      case 'defect-found':
        return [entry.body.where, entry.body.what, entry.body.recommended];
      case 'note-written':
        return [entry.body.text];
      case 'left':
        return [word(entry.body.outcome), word(entry.body.present), entry.body.nextSteps];
      case 'question-answered':
        return [entry.body.answer];
      case 'cautions-read':
      case 'photographs-added':
      case 'people-clear':
      case 'corrected':
        return [];
    }
  }
}
