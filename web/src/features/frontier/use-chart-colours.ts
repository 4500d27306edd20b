import { useMemo } from 'react';
import { useTheme } from '../../lib/theme';
import { useMedia } from '../../ui/use-media';

interface ChartColours {
  lookedAt: string;
  onceKept: string;
  grid: string;
}

/** The chart's colours as a canvas takes them: resolved, and again whenever the theme changes. */
export function useChartColours(): ChartColours {
  const theme = useTheme();
  const systemDark = useMedia('(prefers-color-scheme: dark)');
  const forced = useMedia('(forced-colors: active)');
  const paper = useMedia('print');
  const key = [theme, systemDark, forced, paper].join(' ');
  return useMemo(() => (forced ? FORCED : tokensFor(key)), [forced, key]);
}

const FORCED: ChartColours = { lookedAt: 'GrayText', onceKept: 'CanvasText', grid: 'GrayText' };

/** Reads the tokens in force; `_key` names what they depend on. */
function tokensFor(_key: string): ChartColours {
  const style = getComputedStyle(document.documentElement);
  const token = (name: string) => style.getPropertyValue(`--mw-chart-${name}`).trim();
  return { lookedAt: token('visited'), onceKept: token('displaced'), grid: token('grid') };
}
