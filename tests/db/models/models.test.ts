import type { Model, ModelStatic } from 'sequelize';
import { describe, expect, it } from 'vitest';
import {
  Blanket,
  BlanketColourLink,
  BlanketRevision,
  Colourway,
  DyeLot,
  MadeMotifRow,
  MakingTick,
  MakingWeighing,
  MotifRow,
  MotifVersion,
  OwnStitchRow,
  PartSkein,
  ShoppingList,
  Swatch,
  SwatchMeasurement,
  Yarn,
} from '../../../db/models';
import { MADE_MOTIF_EXAMPLE, MOTIF_EXAMPLE, PLAN_EXAMPLE } from '../../../src/server/examples';

const AT = new Date('2026-12-01T09:00:00Z');
const EDITED = { version: 3, createdAt: AT, updatedAt: AT };
const [motif] = PLAN_EXAMPLE.motifs;
const PATTERN = {
  ...MOTIF_EXAMPLE,
  ring: motif!.ring,
  rounds: motif!.rounds,
  errors: 1,
  warnings: 2,
};

/** A value for every attribute of every model. */
const VALUES = [
  [
    Yarn,
    {
      id: 'y',
      ownerId: 'u',
      name: 'Towpath DK',
      maker: 'Ostler & Fenn',
      fibre: 'wool',
      weightCategory: 3,
      putUpMassG: 100,
      putUpLengthM: 240,
      priceMinor: 720,
      currency: 'EUR',
      ...EDITED,
    },
  ],
  [Colourway, { id: 'c', ownerId: 'u', yarnId: 'y', name: 'Lock Gate', hex: '#3b4a3f', ...EDITED }],
  [
    DyeLot,
    {
      id: 'd',
      ownerId: 'u',
      colourwayId: 'c',
      lotCode: '2207',
      location: 'basket',
      pricePaidMinor: 700,
      currency: 'EUR',
      wholeSkeins: 2,
      ...EDITED,
    },
  ],
  [PartSkein, { id: 'p', dyeLotId: 'd', position: 0, massG: 41.5 }],
  [
    Swatch,
    {
      id: 's',
      ownerId: 'u',
      yarnId: 'y',
      name: 'Sc',
      stitch: 'sc',
      stitches: 20,
      rows: 24,
      hookMm: 4.5,
      notes: 'loose',
      ...EDITED,
    },
  ],
  [
    SwatchMeasurement,
    {
      id: 'm',
      swatchId: 's',
      position: 0,
      measuredOn: '2026-11-08',
      kind: 'size',
      widthMm: 140,
      heightMm: 154,
      blocked: false,
      massG: 14,
      resolutionG: 1,
      lengthM: 33.5,
      errorM: 0.3,
    },
  ],
  [
    OwnStitchRow,
    {
      id: 'o',
      ownerId: 'u',
      abbreviation: 'lst',
      name: 'long stitch',
      wraps: 1,
      draws: 1,
      throughs: 3,
      heightOverWidth: 2.2,
      takes: 1,
      symbol: { body: 'legs', legs: 1, bars: 3 },
      ...EDITED,
    },
  ],
  [
    MadeMotifRow,
    {
      id: 'q',
      ownerId: 'u',
      motifKey: 'group-square',
      motifVersion: 2,
      madeOn: '2026-11-28',
      rounds: 4,
      swatchId: 's',
      weightCategory: 4,
      putUpMassG: 100,
      putUpLengthM: 200,
      sizes: MADE_MOTIF_EXAMPLE.sizes,
      weighedCount: 4,
      weighedMassG: 44,
      weighedResolutionG: 1,
      weighedYarns: 4,
      blocked: true,
      notes: 'flat',
      ...EDITED,
    },
  ],
  [MotifRow, { id: 'm', ownerId: 'u', ...PATTERN, ...EDITED }],
  [MotifVersion, { motifId: 'm', version: 2, ...PATTERN, savedAt: AT }],
  [
    Blanket,
    {
      id: 'b',
      ownerId: 'u',
      title: 'Eighty squares',
      plan: PLAN_EXAMPLE,
      schemaVersion: 1,
      makingOrder: 'outwards',
      makingOrderAt: AT,
      deletedAt: AT,
      ...EDITED,
    },
  ],
  [
    BlanketRevision,
    { blanketId: 'b', version: 1, title: 'T', plan: PLAN_EXAMPLE, schemaVersion: 1, savedAt: AT },
  ],
  [MakingTick, { blanketId: 'b', motif: 'm0:0', done: true, at: AT }],
  [
    MakingWeighing,
    {
      id: 'w',
      blanketId: 'b',
      colour: 'c1',
      leftG: 62,
      resolutionG: 1,
      made: { sc: 3 },
      tails: 2,
      gone: false,
      at: AT,
    },
  ],
  [BlanketColourLink, { blanketId: 'b', colourKey: 'c1', ownerId: 'u', colourwayId: 'c' }],
  [
    ShoppingList,
    {
      id: 'l',
      ownerId: 'u',
      blanketId: 'b',
      title: 'T',
      yarnName: 'Towpath DK',
      currency: 'EUR',
      confidence: 0.95,
      lines: [],
      bought: ['c1'],
      ...EDITED,
    },
  ],
] as const;

describe('models', () => {
  it.each(VALUES)('%o lets every field be read that it was built with', (each, values) => {
    const model = each as unknown as ModelStatic<Model>;
    const row = model.build(values as never) as unknown as Record<string, unknown>;
    expect(Object.keys(model.getAttributes()).sort()).toEqual(Object.keys(values).sort());
    for (const [field, value] of Object.entries(values)) expect(row[field]).toEqual(value);
  });
});
