/** The five places of the product, in the order in which a blanket comes to be. */
export const siteNav = [
  { key: 'swatches', href: '/swatches', word: 'Swatches' },
  { key: 'motifs', href: '/motifs', word: 'Motifs' },
  { key: 'joins', href: '/joins', word: 'Joins' },
  { key: 'blankets', href: '/blankets', word: 'Blankets' },
  { key: 'stash', href: '/stash', word: 'Stash' },
] as const;

export type SiteNavKey = (typeof siteNav)[number]['key'];
