import { type ChartTheme, lightTheme } from './chartTheme.ts';

/** The CSS variable that carries each colour (see index.css). */
const variables: Record<Exclude<keyof ChartTheme, 'fontFamily'>, string> = {
  paper: '--color-paper',
  ink: '--color-ink',
  muted: '--color-muted',
  line: '--color-line',
  held: '--color-held',
  slipped: '--color-slipped',
  lost: '--color-lost',
  limit: '--color-accent',
};

/**
 * The theme in force on the page, light, dark or print, in colours that plotly can read: the
 * browser computes each variable, whatever notation it is written in.
 */
export function readChartTheme(root: HTMLElement): ChartTheme {
  const styles = getComputedStyle(root);
  const theme = { ...lightTheme };
  const probe = document.createElement('span');
  probe.hidden = true;
  root.append(probe);
  for (const name of Object.keys(variables) as (keyof typeof variables)[]) {
    const value = styles.getPropertyValue(variables[name]).trim();
    if (value === '') continue;
    probe.style.color = '';
    probe.style.color = value;
    const computed = getComputedStyle(probe).color;
    if (/^rgb\(|^#/.test(computed)) theme[name] = computed;
  }
  probe.remove();
  return theme;
}
