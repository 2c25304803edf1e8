/** Display modes: paper by day, night before dawn, sun in glare (black on white, heavier strokes). */
export const displayModes = ['paper', 'night', 'sun'] as const;
export type DisplayMode = (typeof displayModes)[number];

interface ModeColours {
  paper: string;
  raised: string;
  ink: string;
  primary: string;
  onPrimary: string;
  ember: string;
  onEmber: string;
  brass: string;
  meltwater: string;
  frost: string;
  line: string;
}

/** Every pair of text and ground below is at least 7:1; measured by `contrast.test.ts`. */
export const modeColours: Record<DisplayMode, ModeColours> = {
  paper: {
    paper: '#F7F5EF',
    raised: '#FFFFFF',
    ink: '#14211C',
    primary: '#1C4A3A',
    onPrimary: '#FFFFFF',
    ember: '#8F2F08',
    onEmber: '#FFFFFF',
    brass: '#6B4A00',
    meltwater: '#12506A',
    frost: '#DDEBF0',
    line: '#5C6A64',
  },
  night: {
    paper: '#0E1512',
    raised: '#18221D',
    ink: '#EDF2EE',
    primary: '#9FD8BF',
    onPrimary: '#0B1F17',
    ember: '#FFB089',
    onEmber: '#2A0E02',
    brass: '#F0C96B',
    meltwater: '#93D2EC',
    frost: '#23363D',
    line: '#8FA097',
  },
  sun: {
    paper: '#FFFFFF',
    raised: '#FFFFFF',
    ink: '#000000',
    primary: '#00281A',
    onPrimary: '#FFFFFF',
    ember: '#7A1F00',
    onEmber: '#FFFFFF',
    brass: '#4A3200',
    meltwater: '#003A52',
    frost: '#FFFFFF',
    line: '#000000',
  },
};
