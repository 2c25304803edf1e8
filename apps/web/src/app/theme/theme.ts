import { createTheme, type Theme } from '@mui/material/styles';
import { modeColours, type DisplayMode } from './modes';

declare module '@mui/material/styles' {
  interface TypographyVariants {
    reading: React.CSSProperties;
  }
  interface TypographyVariantsOptions {
    reading?: React.CSSProperties;
  }
}
declare module '@mui/material/Typography' {
  interface TypographyPropsVariantOverrides {
    reading: true;
  }
}

const sans = '"IBM Plex Sans", system-ui, sans-serif';
const mono = '"IBM Plex Mono", ui-monospace, monospace';

/** The look of one display mode: sizes for gloves, type for arm's length, no shadows, no gradients. */
export function themeOf(mode: DisplayMode): Theme {
  const colours = modeColours[mode];
  const weight = mode === 'sun' ? 600 : 400;
  const stroke = mode === 'sun' ? 3 : 2;
  return createTheme({
    palette: {
      mode: mode === 'night' ? 'dark' : 'light',
      primary: { main: colours.primary, contrastText: colours.onPrimary },
      error: { main: colours.ember, contrastText: colours.onEmber },
      warning: { main: colours.brass, contrastText: colours.paper },
      info: { main: colours.meltwater, contrastText: colours.paper },
      success: { main: colours.primary, contrastText: colours.onPrimary },
      background: { default: colours.paper, paper: colours.raised },
      text: { primary: colours.ink, secondary: colours.ink, disabled: colours.ink },
      divider: colours.line,
    },
    shape: { borderRadius: 4 },
    typography: {
      fontFamily: sans,
      fontSize: 16,
      body1: { fontSize: 18, fontWeight: weight, lineHeight: 1.4 },
      body2: { fontSize: 16, fontWeight: weight, lineHeight: 1.4 },
      h1: { fontSize: 30, fontWeight: 700, lineHeight: 1.2 },
      h2: { fontSize: 22, fontWeight: 700, lineHeight: 1.25 },
      h3: { fontSize: 19, fontWeight: 700, lineHeight: 1.3 },
      button: { fontSize: 18, fontWeight: 600, textTransform: 'none', lineHeight: 1.25 },
      reading: { fontFamily: mono, fontSize: 32, fontWeight: 600, fontVariantNumeric: 'tabular-nums' },
    },
    components: {
      MuiButtonBase: { defaultProps: { disableRipple: true } },
      MuiButton: {
        defaultProps: { disableElevation: true },
        styleOverrides: {
          root: {
            minHeight: 56,
            '&.Mui-disabled': { color: colours.ink, borderStyle: 'dashed', borderColor: colours.line },
          },
          outlined: { borderWidth: stroke, '&:hover': { borderWidth: stroke } },
        },
      },
      MuiOutlinedInput: {
        styleOverrides: {
          root: { fontSize: 18, minHeight: 56 },
          notchedOutline: { borderWidth: stroke, borderColor: colours.line },
        },
      },
      MuiInputLabel: { styleOverrides: { root: { fontSize: 18, color: colours.ink } } },
      MuiFormHelperText: {
        styleOverrides: {
          root: {
            fontSize: 16,
            color: colours.ink,
            '&.Mui-error': { color: colours.ember, fontWeight: 600 },
          },
        },
      },
      MuiCssBaseline: {
        styleOverrides: {
          body: { backgroundColor: colours.paper, color: colours.ink },
          ':focus-visible': { outline: `3px solid ${colours.meltwater}`, outlineOffset: 2 },
        },
      },
    },
  });
}
