import { MM_PER_INCH } from '../units/conversion';

/** A size of blanket with a name of its own. */
export interface BlanketSize {
  readonly key: string;
  readonly name: string;
  readonly widthMm: number;
  readonly heightMm: number;
}

const inches = (key: string, name: string, width: number, height: number): BlanketSize => ({
  key,
  name,
  widthMm: width * MM_PER_INCH,
  heightMm: height * MM_PER_INCH,
});

/**
 * Usual sizes of blankets, from makers' own compilations (justastitchaway.blogspot.com, 6 Mar 2008;
 * the lap crochetcabana.com): no association publishes any, so that each is a place to start from.
 */
export const BLANKET_SIZES: readonly BlanketSize[] = [
  inches('baby', 'Baby', 30, 36),
  inches('lap', 'Lap', 36, 48),
  inches('throw', 'Throw', 50, 70),
  inches('single', 'Single', 66, 90),
  inches('double', 'Double', 80, 90),
  inches('king', 'King', 108, 100),
];
