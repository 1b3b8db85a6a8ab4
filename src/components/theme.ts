/** The header's colour, for the browser's own frame. Must match `surface` in global.css. */
export const themeColour = { light: '#fcfefe', dark: '#162325' } as const;
