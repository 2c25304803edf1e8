import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { PhoneScreen } from '../../../components/PhoneScreen';
import { useVisitLog } from '../log/visit-log';
import type { VisitTexts } from '../texts.en';

interface Props {
  step: keyof VisitTexts['stepNames'] | 'defects';
  action?: ReactNode;
  children: ReactNode;
}

/** The frame of one step of the work: its name, the way back to the list, the main action under the thumb. */
export function StepScreen({ step, action, children }: Props) {
  const { t } = useTranslation('visit');
  const { visit } = useVisitLog();
  return (
    <PhoneScreen
      title={step === 'defects' ? t('defects.title') : t(`stepNames.${step}`)}
      subtitle={visit.site.name}
      back={`/visit/${visit.id}`}
      action={action}
    >
      {children}
    </PhoneScreen>
  );
}
