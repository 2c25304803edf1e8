import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { NavLink, Outlet } from 'react-router-dom';
import { addTexts } from '../../app/i18n/i18n';
import logEn from '../../app/log-words/texts.en';
import logEs from '../../app/log-words/texts.es';
import en from '../../features/review/texts.en';
import es from '../../features/review/texts.es';
import { useSession } from '../../features/session/session-context';
export { RouteFault as ErrorBoundary } from '../../app/RouteFault';

addTexts('review', { en, es });
addTexts('log', { en: logEn, es: logEs });

const sections = [
  ['/review', 'review'],
  ['/today', 'today'],
  ['/settings', 'settings'],
] as const;

/** Every desk screen stands below the company's name and the way to the other screens. */
export function Component() {
  const { t } = useTranslation();
  const { enrolment } = useSession();
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: {
          queries: { networkMode: 'always', retry: 1, staleTime: 5_000 },
          mutations: { networkMode: 'always' },
        },
      }),
  );
  const shown = sections.filter(([path]) => path !== '/today' || enrolment?.user.role === 'supervisor');
  return (
    <QueryClientProvider client={client}>
      <Box
        component="nav"
        sx={{
          display: 'flex',
          gap: 1,
          alignItems: 'center',
          flexWrap: 'wrap',
          px: { xs: 2, md: 3 },
          py: 1,
          borderBottom: 2,
          borderColor: 'divider',
        }}
      >
        <Box component="span" sx={{ fontWeight: 700, color: 'primary.main', mr: 2, fontSize: 20 }}>
          {enrolment?.company.name}
        </Box>
        {shown.map(([path, name]) => (
          <Button
            key={path}
            component={NavLink}
            to={path}
            sx={{ '&[aria-current]': { textDecoration: 'underline', textUnderlineOffset: 6 } }}
          >
            {t(`nav.${name}`)}
          </Button>
        ))}
      </Box>
      <Outlet />
    </QueryClientProvider>
  );
}
