/** Invented colours, the palest and the darkest among them. */
export const yarns = [
  { name: 'Harbour', hex: '#2d5872', lot: 'K418', amount: '1,184 m', fraction: 0.85 },
  { name: 'Oat', hex: '#eadfc8', lot: 'K402', amount: '930 m', fraction: 0.66 },
  { name: 'Rowan', hex: '#b8432f', lot: 'K377', amount: '214 m', fraction: 0.15 },
  { name: 'Lichen', hex: '#a9b468', lot: 'K391', amount: '207 m', fraction: 0.15 },
  { name: 'Damson', hex: '#562a46', lot: 'K388', amount: '206 m', fraction: 0.14 },
  { name: 'Chalk', hex: '#fdfdfb', lot: 'K301', amount: '88 m', fraction: 0.06 },
  { name: 'Soot', hex: '#0d0f12', lot: 'K300', amount: '41 m', fraction: 0.03 },
] as const;
