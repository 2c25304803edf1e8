import { zoneIsDone, type Zone } from '@rimeward/field-log';
import { useTranslation } from 'react-i18next';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { useVisitLog } from '../log/visit-log';

interface Props {
  order: Zone[];
  current: string;
  onChoose: (zoneId: string) => void;
}

/** All zones in working order with what has been done in each. */
export function ZonePicker({ order, current, onChoose }: Props) {
  const { t } = useTranslation('visit');
  const { state } = useVisitLog();
  return (
    <ChoiceTiles
      label={t('air.chooseZone')}
      options={order.map((zone) => {
        const done = state.zones[zone.id];
        const cycles = t('air.cycles', { count: done?.cycles.length ?? 0 });
        const word = done?.skipped ? t('air.skipped') : zoneIsDone(done) ? t('stepStatus.done') : cycles;
        return {
          value: zone.id,
          label: t('air.zone', { number: zone.number }),
          hint: `${zone.name} · ${word}`,
        };
      })}
      value={current}
      onChange={onChoose}
    />
  );
}
