import { DIAGONALS } from '../colour/placement';
import { readyMotif } from '../motifs/readyMotifs';
import type { Motif } from '../motifs/motif';
import { lengthM, massG, priceMinor, widthMm } from '../units/quantities';
import type { Plan } from './plan';

/** The plan that the front page opens with: eighty group squares in five colours. */
export const EXAMPLE_PLAN: Plan = {
  yarn: {
    name: 'Lindry Aran',
    weightCategory: 4,
    putUp: { massG: massG(100), lengthM: lengthM(200) },
    price: { priceMinor: priceMinor(640), currency: 'EUR' },
  },
  colours: [
    { key: 'c1', name: 'Skerry', hex: '#2f5d73' },
    { key: 'c2', name: 'Barley', hex: '#e6d9c2' },
    { key: 'c3', name: 'Rosehip', hex: '#bf4630' },
    { key: 'c4', name: 'Bracken', hex: '#9aa653' },
    { key: 'c5', name: 'Sloe', hex: '#5a2e4b' },
  ],
  swatch: { stitch: 'sc', stitches: 20, rows: 18, widthMm: widthMm(150), heightMm: widthMm(124) },
  evidence: [
    {
      piece: 'motifs',
      count: 4,
      motifIndex: 0,
      reading: { by: 'weighing', massG: massG(40), resolutionG: massG(1) },
    },
  ],
  motifs: [readyMotif('group-square', 4) as Motif],
  colourways: [
    { motifIndex: 0, roundColours: ['c2', 'c3', 'c4', 'c2'] },
    { motifIndex: 0, roundColours: ['c2', 'c5', 'c3', 'c2'] },
    { motifIndex: 0, roundColours: ['c2', 'c4', 'c5', 'c2'] },
  ],
  motifSideMm: null,
  size: { by: 'grid', rows: 10, columns: 8 },
  layout: null,
  edge: 'toothed',
  secondMotif: null,
  placement: DIAGONALS,
  join: { key: 'flat-braid', colour: 'c1' },
  corners: 'crossed',
  border: [
    { stitch: 'sc', colour: 'c1' },
    { stitch: 'sc', colour: 'c2' },
    { stitch: 'sc', colour: 'c1' },
  ],
  confidence: 0.95,
  secondsPerMove: null,
};
