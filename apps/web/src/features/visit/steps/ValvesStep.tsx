import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { EntryBody, HandValve, PhotoReference } from '@rimeward/field-log';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { MainAction } from '../../../components/MainAction';
import { useDraftValue } from '../log/use-draft-value';
import { useVisitLog } from '../log/visit-log';
import { VisitPhotos } from '../log/visit-photos';
import { StepScreen } from './StepScreen';
import { ValvePicture } from './ValvePicture';

type Stage = EntryBody<'valve-set'>['stage'];
type Position = EntryBody<'valve-set'>['position'];
const positions = ['half-open', 'closed', 'open', 'other'] as const;

interface Props {
  stage: Stage;
  onDone: () => void;
}

/**
 * The hand valves of the backflow assembly, one by one. Before air only the shutoffs matter (closed); for the winter every
 * shutoff, test cock and vent screw is worked and left half open.
 */
export function ValvesStep({ stage, onDone }: Props) {
  const { t } = useTranslation('visit');
  const { visit, system, state, save } = useVisitLog();
  const wanted: Position = stage === 'winter' ? 'half-open' : 'closed';
  const valves = system.backflow.valves.filter((valve) => stage === 'winter' || valve.role === 'shutoff');
  const open = valves.filter((valve) => !positionOf(valve));
  const [photos, setPhotos, dropPhotos] = useDraftValue<PhotoReference[]>(
    `visit/${visit.id}/valves/${stage}/photos`,
    [],
  );

  function positionOf(valve: HandValve): Position | null {
    const said = state.valves[valve.id];
    return (stage === 'winter' ? said?.winter?.position : said?.beforeAir?.position) ?? null;
  }

  async function set(valve: HandValve, position: Position): Promise<void> {
    const workedThrough = stage === 'winter' && position === 'half-open';
    await save('valve-set', { valveId: valve.id, stage, position, workedThrough });
  }

  async function finish(): Promise<void> {
    if (photos.length > 0) {
      if (!(await save('photographs-added', { subject: valves[0]?.id ?? null }, photos))) return;
      await dropPhotos();
    }
    onDone();
  }

  async function setAllOpen(): Promise<void> {
    for (const valve of open) await set(valve, wanted);
  }

  return (
    <StepScreen
      step={stage === 'winter' ? 'backflow-winter' : 'backflow-before-air'}
      action={
        open.length > 0 ? (
          <MainAction onClick={() => void setAllOpen()}>
            {t(stage === 'winter' ? 'valves.allHalfOpen' : 'valves.allClosed')}
          </MainAction>
        ) : (
          <MainAction onClick={() => void finish()}>{t('visit.stepDone')}</MainAction>
        )
      }
    >
      <Typography>{t(stage === 'winter' ? 'valves.winter' : 'valves.beforeAir')}</Typography>
      <Typography>{`${system.backflow.kind} · ${system.backflow.place}`}</Typography>
      {valves.length === 0 && <Typography>{t('valves.none')}</Typography>}
      {valves.map((valve) => (
        <ValveRow
          key={valve.id}
          valve={valve}
          position={positionOf(valve)}
          onSet={(to) => void set(valve, to)}
        />
      ))}
      {stage === 'winter' && valves.length > 0 && (
        <VisitPhotos
          field="valves"
          role="backflow-valve"
          label={t('valves.photo')}
          photos={photos}
          onChange={setPhotos}
        />
      )}
    </StepScreen>
  );
}

function ValveRow({
  valve,
  position,
  onSet,
}: {
  valve: HandValve;
  position: Position | null;
  onSet: (position: Position) => void;
}) {
  const { t } = useTranslation('visit');
  const [choosing, setChoosing] = useState(false);
  const name = t(`valves.${valve.role}`, { number: valve.number });
  const word = position ? t(`valves.positions.${position}`) : t('valves.notRecorded');
  return (
    <Box sx={{ borderTop: 1, borderColor: 'divider' }}>
      <Button
        fullWidth
        onClick={() => setChoosing(!choosing)}
        aria-expanded={choosing}
        sx={{ minHeight: 80 }}
      >
        <Stack direction="row" spacing={2} sx={{ width: '100%', alignItems: 'center' }}>
          <ValvePicture role={valve.role} position={position} />
          <Typography sx={{ flexGrow: 1, textAlign: 'left' }}>{name}</Typography>
          <Typography sx={{ fontWeight: 600 }}>{word}</Typography>
        </Stack>
      </Button>
      {choosing && (
        <ChoiceTiles
          label={name}
          options={positions.map((value) => ({ value, label: t(`valves.positions.${value}`) }))}
          value={position}
          onChange={(to) => {
            setChoosing(false);
            onSet(to);
          }}
        />
      )}
    </Box>
  );
}
