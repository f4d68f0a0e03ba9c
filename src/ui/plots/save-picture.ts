import { completeFigure, type DrawFigure } from './plot-figure';
import { printPalette } from './plot-palette';
import { follow } from './save-file';

const widthPx = 1000;
const heightPx = 560;

/** The figure on white, with its title, as a file. */
export async function savePicture(
  draw: DrawFigure,
  title: string,
  fileName: string,
  format: 'svg' | 'png',
): Promise<void> {
  const { default: Plotly } = await import('plotly.js-dist-min');
  const { data, layout } = completeFigure(draw, printPalette(), 'file');
  const margin = { ...layout.margin, t: (layout.margin?.t ?? 0) + 64 };
  const titled = {
    ...layout,
    margin,
    paper_bgcolor: '#ffffff',
    title: { text: title, x: 0.02, xanchor: 'left' as const, y: 0.97 },
  };
  const size = { width: widthPx, height: heightPx };
  const picture = await Plotly.toImage(
    { data, layout: { ...titled, ...size } },
    { format, ...size, scale: format === 'png' ? 2 : 1 },
  );
  follow(picture, `${fileName}.${format}`);
}
