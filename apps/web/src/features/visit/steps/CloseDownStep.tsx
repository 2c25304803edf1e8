import { useTranslation } from 'react-i18next';
import { Caution } from '../../../components/Caution';
import { ManyTiles } from '../../../components/ChoiceTiles';
import { MainAction } from '../../../components/MainAction';
import { useVisitLog } from '../log/visit-log';
import { StepScreen } from './StepScreen';

const order = ['compressor-off', 'hose-bled', 'hose-off'] as const;

/** Compressor off, hose bled, hose off: the main action is always the next of the three. */
export function CloseDownStep({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const { state, save } = useVisitLog();
  const next = order.find((step) => !state.closeDown[step]);

  async function record(step: (typeof order)[number]): Promise<void> {
    const last = order.every((one) => one === step || state.closeDown[one]);
    if ((await save('air-closed-down', { step })) && last) onDone();
  }

  return (
    <StepScreen
      step="close-down"
      action={
        next ? (
          <MainAction onClick={() => void record(next)}>{t(`closeDown.${next}`)}</MainAction>
        ) : (
          <MainAction onClick={onDone}>{t('visit.stepDone')}</MainAction>
        )
      }
    >
      <Caution picture="hose">{t('closeDown.caution')}</Caution>
      <ManyTiles
        label={t('stepNames.close-down')}
        options={order.map((step) => ({ value: step, label: t(`closeDown.${step}`) }))}
        value={order.filter((step) => state.closeDown[step])}
        onChange={(chosen) => {
          const added = chosen.find((step) => !state.closeDown[step]);
          if (added) void record(added);
        }}
      />
    </StepScreen>
  );
}
