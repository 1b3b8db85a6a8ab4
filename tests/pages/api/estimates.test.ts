import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN } from '../../../src/lib';
import { POST } from '../../../src/pages/api/estimates';
import { estimateSchema } from '../../../src/schemas/estimate';
import { callRoute } from '../../support/callRoute';
import { planInput } from '../../support/factories';
import { expectFieldErrors } from '../../support/refusals';

describe('POST /api/estimates', () => {
  it('answers a stranger with the same figures as the library, to the last digit', async () => {
    const { status, json } = await callRoute(POST, { method: 'POST', body: planInput() });
    expect(status).toBe(200);
    expect(json).toEqual(JSON.parse(JSON.stringify(estimate(EXAMPLE_PLAN))));
    expect(estimateSchema.parse(json)).toEqual(json);
  });

  it('answers a program that sends no Origin', async () => {
    const headers = { origin: null };
    const { status } = await callRoute(POST, { method: 'POST', body: planInput(), headers });
    expect(status).toBe(200);
  });

  it('says what is wrong beside each field', async () => {
    await expectFieldErrors(POST, { method: 'POST', body: planInput() }, [
      {
        change: { yarn: { ...planInput().yarn, putUp: { massG: 0, lengthM: 200 } } },
        fields: { 'yarn.putUp.massG': 'Skein mass must be more than 0 g' },
      },
      {
        change: { size: { by: 'grid', rows: 1e9, columns: -4 } },
        fields: {
          'size.rows': 'Rows of motifs must be at most 400',
          'size.columns': 'Motifs in a row must be at least 1',
        },
      },
      { change: { colours: undefined }, fields: { colours: 'Colours are missing' } },
      { change: { planner: 'me' }, fields: { '': 'Plan has no field named planner' } },
    ]);
  });

  it.each([
    ['', 400, 'malformed'],
    ['{"yarn":', 400, 'malformed'],
    ['null', 400, 'invalid'],
    ['[]', 400, 'invalid'],
    [`"${'x'.repeat(10_000_000)}"`, 413, 'too-large'],
  ])('refuses %.20s', async (body, status, code) => {
    const answer = await callRoute(POST, { method: 'POST', body });
    expect([answer.status, answer.json.error.code]).toEqual([status, code]);
  });

  it('takes nothing but JSON', async () => {
    const headers = { 'content-type': 'text/plain' };
    const { status } = await callRoute(POST, { method: 'POST', body: planInput(), headers });
    expect(status).toBe(415);
  });
});
