import Typography from '@mui/material/Typography';
import { useEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { storageStanding } from '../../phone/storage';
import { sizeText } from '../../app/format/size-text';

type Standing = Awaited<ReturnType<typeof storageStanding>>;

/** How much of the browser's room is used, and whether the browser has promised to keep it. */
export function StorageLine() {
  const { t, i18n } = useTranslation('on-this-phone');
  const [standing, setStanding] = useState<Standing | null>(null);
  useEffect(() => {
    let alive = true;
    void storageStanding().then((found) => {
      if (alive) setStanding(found);
    });
    return () => {
      alive = false;
    };
  }, []);
  if (!standing) return null;
  const language = i18n.resolvedLanguage ?? 'en';
  return (
    <>
      {standing.usedBytes !== null && standing.quotaBytes !== null && (
        <Typography>
          {t('storage', {
            used: sizeText(standing.usedBytes, language),
            quota: sizeText(standing.quotaBytes, language),
          })}
        </Typography>
      )}
      {standing.persisted !== null && (
        <Typography>{t(standing.persisted ? 'persisted' : 'notPersisted')}</Typography>
      )}
    </>
  );
}
