/** The colours and the type a picture is drawn with; plotly takes hex or rgb() only. */
export interface ChartTheme {
  paper: string;
  ink: string;
  muted: string;
  line: string;
  held: string;
  slipped: string;
  lost: string;
  limit: string;
  fontFamily: string;
}

/** The light tokens: what a picture falls back on where a CSS variable is missing. */
export const lightTheme: ChartTheme = {
  paper: '#FAF8F4',
  ink: '#1E2A32',
  muted: '#5B6670',
  line: '#D9D3C7',
  held: '#0E6B67',
  slipped: '#B7791F',
  lost: '#A63A28',
  limit: '#0E6B67',
  fontFamily: 'Lato, system-ui, sans-serif',
};

/** The same colour with an opacity of 0…1, from `#rgb`, `#rrggbb` or `rgb(r, g, b)`. */
export function withOpacity(color: string, opacity: number): string {
  const hex = /^#([0-9a-f]{3}|[0-9a-f]{6})$/i.exec(color.trim())?.[1];
  if (hex !== undefined) {
    const full = hex.length === 3 ? [...hex].map((digit) => digit + digit).join('') : hex;
    const channel = (at: number) => Number.parseInt(full.slice(at, at + 2), 16);
    return `rgba(${channel(0)}, ${channel(2)}, ${channel(4)}, ${opacity})`;
  }
  const channels = /^rgb\(\s*(\d+)[\s,]+(\d+)[\s,]+(\d+)\s*\)$/.exec(color.trim());
  if (channels === null) throw new RangeError(`not a colour a picture can be drawn with: ${color}`);
  return `rgba(${channels[1]}, ${channels[2]}, ${channels[3]}, ${opacity})`;
}
