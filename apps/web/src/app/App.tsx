import CssBaseline from '@mui/material/CssBaseline';
import { ThemeProvider } from '@mui/material/styles';
import { useMemo } from 'react';
import { RouterProvider } from 'react-router-dom';
import { SessionProvider } from '../features/session/SessionProvider';
import { DatabaseGate } from './DatabaseGate';
import { router } from './router';
import { PreferencesProvider, usePreferences } from './theme/preferences';
import { themeOf } from './theme/theme';
import { UpdatePrompt } from './UpdatePrompt';

/** The application: its look, its database, its person, its screens. */
export function App() {
  return (
    <PreferencesProvider>
      <Look />
    </PreferencesProvider>
  );
}

function Look() {
  const [{ mode }] = usePreferences();
  const theme = useMemo(() => themeOf(mode), [mode]);
  return (
    <ThemeProvider theme={theme}>
      <CssBaseline />
      <UpdatePrompt />
      <DatabaseGate>
        <SessionProvider>
          <RouterProvider router={router} />
        </SessionProvider>
      </DatabaseGate>
    </ThemeProvider>
  );
}
