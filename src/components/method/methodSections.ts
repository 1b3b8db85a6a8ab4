/** The parts of the method page, in the order in which a blanket is worked out. */
export const METHOD_SECTIONS = [
  { id: 'reading', word: 'How a pattern is read' },
  { id: 'loops', word: 'From stitches to loops' },
  { id: 'hand', word: 'The yarn in your loops' },
  { id: 'weighing', word: 'How to weigh a swatch well' },
  { id: 'size', word: 'How big it comes out' },
  { id: 'sure', word: 'What “95 % sure” means' },
  { id: 'constants', word: 'The constants' },
  { id: 'units', word: 'Units and terms' },
  { id: 'cautions', word: 'Cautions' },
] as const;

export type MethodSectionId = (typeof METHOD_SECTIONS)[number]['id'];
