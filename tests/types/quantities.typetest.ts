/** Lines that must not compile: `astro check` fails when one of them does. */
import {
  durationS,
  lengthM,
  massG,
  priceMinor,
  widthMm,
  type LengthM,
  type MassG,
  type PutUp,
  type WidthMm,
} from '../../src/lib';

declare function takesYarn(value: LengthM): void;
declare function takesFabric(value: WidthMm): void;
declare function takesMass(value: MassG): void;

takesYarn(lengthM(200));
takesFabric(widthMm(142));
takesMass(massG(100));

// A quantity is a number, so that it can be shown and added up.
export const sumM: number = lengthM(200) + lengthM(100);

// @ts-expect-error metres of yarn are not millimetres of fabric
takesFabric(lengthM(200));
// @ts-expect-error millimetres of fabric are not metres of yarn
takesYarn(widthMm(142));
// @ts-expect-error grams are not metres
takesYarn(massG(100));
// @ts-expect-error metres are not grams
takesMass(lengthM(200));
// @ts-expect-error money is not yarn
takesYarn(priceMinor(640));
// @ts-expect-error time is not fabric
takesFabric(durationS(90));
// @ts-expect-error a bare number has no unit
takesYarn(200);
// @ts-expect-error a sum is a bare number again and must be given its unit
takesYarn(lengthM(200) + lengthM(100));
// @ts-expect-error mass and length of a put-up the wrong way round
export const putUp: PutUp = { massG: lengthM(200), lengthM: massG(100) };
