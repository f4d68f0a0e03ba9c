export type PlotPalette = {
  paper: string;
  ink: string;
  muted: string;
  line: string;
  chaff: string;
  unbound: string;
  bound: string;
  /** One per material, told apart by their dashes as well. */
  materials: readonly string[];
};

const tokens = ['paper', 'ink', 'muted', 'line', 'chaff', 'unbound', 'bound'] as const;

/** At least 3:1 on the paper of their theme, and away from the two fate colours. */
const materialColours = {
  light: ['#1f6f5c', '#8c3f86', '#7a5c00', '#4a5568', '#a3324a', '#2b5c9e'],
  dark: ['#6fd0b4', '#dc9ad6', '#e2c25a', '#b4bccb', '#f0919f', '#92b8ee'],
};

export const materialDashes = ['solid', 'dash', 'dot', 'dashdot', 'longdash', 'longdashdot'] as const;

export const nthOf = <T>(choices: readonly T[], index: number): T => choices[index % choices.length];

export function isDark(): boolean {
  return document.documentElement.classList.contains('dark');
}

export function screenPalette(): PlotPalette {
  const style = getComputedStyle(document.documentElement);
  const colours = Object.fromEntries(tokens.map((token) => [token, style.getPropertyValue(`--${token}`).trim()]));
  return { ...(colours as Omit<PlotPalette, 'materials'>), materials: materialColours[isDark() ? 'dark' : 'light'] };
}

/** Files are always light: they end up on white pages. Nothing is painted between the two changes of class. */
export function printPalette(): PlotPalette {
  if (!isDark()) return screenPalette();
  const { classList } = document.documentElement;
  classList.remove('dark');
  try {
    return screenPalette();
  } finally {
    classList.add('dark');
  }
}
