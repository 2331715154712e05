/** The grid in the colours of the pane. */
import { markColour } from '../../../../taskpane/markColours';
import { defaultTheme } from '@univerjs/themes';

const markColours = Object.fromEntries(
  Object.keys(defaultTheme['loop-color']).map((name, place) => [name, markColour(place)]),
);

/** From the pale tint of a selected row to the ink of the pane's buttons. */
export const gridTheme: typeof defaultTheme = {
  ...defaultTheme,
  primary: {
    50: '#eef6f6',
    100: '#d9ebec',
    200: '#b4d7da',
    300: '#86c9d0',
    400: '#4d9aa3',
    500: '#2c7882',
    600: '#175c66',
    700: '#124a52',
    800: '#0e3a41',
    900: '#10262a',
  },
  /** What a formula reads while it is edited. */
  'loop-color': { ...defaultTheme['loop-color'], ...markColours },
};
