import type { OnThisPhoneTexts } from '../../features/on-this-phone/texts.en';
import type { ReviewTexts } from '../../features/review/texts.en';
import type { SettingsTexts } from '../../features/settings/texts.en';
import type { TodayTexts } from '../../features/today/texts.en';
import type { VisitTexts } from '../../features/visit/texts.en';
import type { LogTexts } from '../log-words/texts.en';
import type { ShellTexts } from '../texts.en';

declare module 'i18next' {
  interface CustomTypeOptions {
    defaultNS: 'shell';
    resources: {
      shell: ShellTexts;
      log: LogTexts;
      today: TodayTexts;
      visit: VisitTexts;
      'on-this-phone': OnThisPhoneTexts;
      review: ReviewTexts;
      settings: SettingsTexts;
    };
  }
}
