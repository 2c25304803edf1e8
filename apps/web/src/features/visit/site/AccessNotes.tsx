import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useLiveQuery } from 'dexie-react-hooks';
import { useTranslation } from 'react-i18next';
import { siteAccess } from '../../../phone/queries/access';
import { useVisitLog } from '../log/visit-log';

/** Gate code and access notes: decrypted only here, and only while the phone's lease is good. */
export function AccessNotes() {
  const { t } = useTranslation('visit');
  const { visit } = useVisitLog();
  const access = useLiveQuery(() => siteAccess(visit.id), [visit.id]);
  if (!access) return null;
  if ('withheld' in access) return <Typography>{t('arrive.hidden')}</Typography>;
  if (!access.gateCode && !access.accessNotes) return null;
  return (
    <Box sx={{ border: 2, borderColor: 'divider', p: 2 }}>
      {access.gateCode && (
        <>
          <Typography>{t('arrive.gateCode')}</Typography>
          <Typography variant="reading" component="p">
            {access.gateCode}
          </Typography>
        </>
      )}
      {access.accessNotes && <Typography>{`${t('arrive.access')}: ${access.accessNotes}`}</Typography>}
    </Box>
  );
}
