import type { EntryBody, EntryType, PhotoReference } from '@rimeward/field-log';
import { foldVisit, visitSteps } from '@rimeward/field-log';
import { useLiveQuery } from 'dexie-react-hooks';
import { useCallback, useMemo, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { PhoneScreen } from '../../../components/PhoneScreen';
import { UndoBar } from '../../../components/UndoBar';
import type { Enrolment } from '../../../phone/device/enrolment';
import { companyDocument } from '../../../phone/queries/company';
import { entriesOfVisit } from '../../../phone/queries/entries';
import { visitDocument } from '../../../phone/queries/visits';
import { saveEntry, type NewEntry, type SaveFault } from '../../../phone/save/save-entry';
import { zoneCeilings } from './ceilings';
import { VisitLogContext, type VisitLog } from './visit-log';

type Notice = { kind: 'saved'; entryId: string } | { kind: 'undone' } | { kind: 'fault'; fault: SaveFault };

interface Props {
  visitId: string;
  enrolment: Enrolment;
  children: ReactNode;
}

/** Reads the visit from this phone, folds its entries on every change, and writes new ones. */
export function VisitLogProvider({ visitId, enrolment, children }: Props) {
  const { t } = useTranslation('visit');
  const visit = useLiveQuery(() => visitDocument(visitId), [visitId]);
  const entries = useLiveQuery(() => entriesOfVisit(visitId), [visitId]);
  const company = useLiveQuery(() => companyDocument(), []);
  const [notice, setNotice] = useState<Notice | null>(null);
  const { user, company: mine } = enrolment;

  const state = useMemo(() => (entries ? foldVisit(entries) : null), [entries]);
  const steps = useMemo(() => (visit && state ? visitSteps(state, visit.system) : []), [visit, state]);
  const cap = company?.settings.pressureCapPsi ?? mine.settings.pressureCapPsi;
  const ceilings = useMemo(() => (visit ? zoneCeilings(visit.system, cap) : {}), [visit, cap]);

  const write = useCallback(
    async <T extends EntryType>(
      type: T,
      body: EntryBody<T>,
      photos?: PhotoReference[],
    ): Promise<string | null> => {
      // Type and body belong together by the signature above.
      const entry = { visit: visitId, type, body, photos, actor: user.id, company: mine.id } as NewEntry;
      const saved = await saveEntry(entry);
      if (!saved.ok) {
        setNotice({ kind: 'fault', fault: saved.fault });
        return null;
      }
      return saved.entry.id;
    },
    [visitId, user.id, mine.id],
  );
  const save = useCallback<VisitLog['save']>(
    async (type, body, photos) => {
      const entryId = await write(type, body, photos);
      if (entryId) setNotice({ kind: 'saved', entryId });
      return entryId !== null;
    },
    [write],
  );
  const withdraw = useCallback<VisitLog['withdraw']>(
    async (entryId, reason) => {
      const done = await write('corrected', { of: entryId, reason, body: null });
      if (done) setNotice({ kind: 'undone' });
      return done !== null;
    },
    [write],
  );

  if (visit === undefined || entries === undefined || company === undefined) {
    return <PhoneScreen title={t('visit.title')}>{t('visit.loading')}</PhoneScreen>;
  }
  if (!visit || !state) {
    return (
      <PhoneScreen title={t('visit.title')} back="/today">
        {t('visit.notHere')}
      </PhoneScreen>
    );
  }

  const all = Object.values(ceilings);
  const names = new Map([...(company?.people ?? []), user].map((person) => [person.id, person.name]));
  const log: VisitLog = {
    visit,
    system: visit.system,
    company,
    state,
    steps,
    ceilings,
    lowestCeiling:
      all.length > 0 ? all.reduce((low, one) => (one.pressurePsi < low.pressurePsi ? one : low)) : null,
    me: { userId: user.id, blowOutSignedOff: user.blowOutSignedOff },
    save,
    withdraw,
    nameOf: (userId) => names.get(userId) ?? userId.slice(0, 8),
  };

  return (
    <VisitLogContext.Provider value={log}>
      {children}
      {notice?.kind === 'saved' && (
        <UndoBar
          key={notice.entryId}
          message={t('visit.saved')}
          undoLabel={t('visit.undo')}
          onUndo={() => void withdraw(notice.entryId, t('visit.slip'))}
          onGone={() => setNotice(null)}
        />
      )}
      {notice?.kind === 'undone' && <UndoBar message={t('visit.undone')} onGone={() => setNotice(null)} />}
      {notice?.kind === 'fault' && (
        <UndoBar tone="fault" message={t(`saveFaults.${notice.fault}`)} onGone={() => setNotice(null)} />
      )}
    </VisitLogContext.Provider>
  );
}
