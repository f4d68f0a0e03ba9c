import { CellStyleModule, InfiniteRowModelModule, ModuleRegistry, RowApiModule, themeQuartz } from 'ag-grid-community';

ModuleRegistry.registerModules([InfiniteRowModelModule, CellStyleModule, RowApiModule]);

export const gridTheme = themeQuartz.withParams({
  accentColor: 'var(--chaff)',
  backgroundColor: 'var(--panel)',
  foregroundColor: 'var(--ink)',
  borderColor: 'var(--line)',
  headerBackgroundColor: 'var(--paper)',
  headerTextColor: 'var(--ink)',
  headerFontWeight: 600,
  oddRowBackgroundColor: 'var(--panel)',
  fontFamily: 'inherit',
  dataFontSize: 13,
  headerFontSize: 13,
  spacing: 6,
  wrapperBorderRadius: 6,
});
