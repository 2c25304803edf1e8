import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useEffect, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';

interface Props {
  title: string;
  subtitle?: string;
  /** Where the arrow at the top leads; without one there is no arrow. */
  back?: string;
  action?: ReactNode;
  children: ReactNode;
}

/** Frame of every phone screen: name and way back at the top, the work in the middle, the main action at the bottom. */
export function PhoneScreen({ title, subtitle, back, action, children }: Props) {
  const { t } = useTranslation();
  useEffect(() => {
    document.title = `${title} · Rimeward`;
    window.scrollTo(0, 0);
  }, [title]);
  return (
    <Box sx={{ minHeight: '100dvh', display: 'flex', flexDirection: 'column', maxWidth: 640, mx: 'auto' }}>
      <Stack component="header" direction="row" spacing={1} sx={{ alignItems: 'center', px: 2, pt: 1 }}>
        {back && (
          <Button component={Link} to={back} aria-label={t('back')} sx={{ minWidth: 56, px: 0 }}>
            <svg width="32" height="32" viewBox="0 0 32 32" aria-hidden="true">
              <path d="M20 5 9 16l11 11" fill="none" stroke="currentColor" strokeWidth="4" />
            </svg>
          </Button>
        )}
        <Box sx={{ minWidth: 0, py: 1 }}>
          <Typography variant="h1" sx={{ fontSize: 24, overflowWrap: 'anywhere' }}>
            {title}
          </Typography>
          {subtitle && <Typography>{subtitle}</Typography>}
        </Box>
      </Stack>
      <Stack component="main" spacing={3} sx={{ flexGrow: 1, p: 2, pb: 3 }}>
        {children}
      </Stack>
      {action && (
        <Box
          component="footer"
          sx={{
            position: 'sticky',
            bottom: 0,
            zIndex: 10,
            bgcolor: 'background.default',
            p: 2,
            pb: 'max(16px, env(safe-area-inset-bottom))',
            borderTop: 2,
            borderColor: 'divider',
          }}
        >
          {action}
        </Box>
      )}
    </Box>
  );
}
