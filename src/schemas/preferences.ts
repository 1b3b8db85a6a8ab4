import * as z from './zod';

export const UNIT_SYSTEMS = ['metric', 'imperial'] as const;
export const TERM_SYSTEMS = ['us', 'uk'] as const;
export const THEMES = ['system', 'light', 'dark'] as const;

/** ISO 4217 codes offered, those with two or no decimal places. */
export const CURRENCIES = [
  'AUD',
  'BRL',
  'CAD',
  'CHF',
  'CZK',
  'DKK',
  'EUR',
  'GBP',
  'HUF',
  'INR',
  'JPY',
  'KRW',
  'MXN',
  'NOK',
  'NZD',
  'PLN',
  'SEK',
  'SGD',
  'USD',
  'ZAR',
] as const;

export const currencySchema = z.enum(CURRENCIES, {
  error: 'Choose one of the listed currencies, for example EUR.',
});

export const preferencesSchema = z.object({
  units: z.enum(UNIT_SYSTEMS, { error: 'Choose metric or imperial.' }),
  terms: z.enum(TERM_SYSTEMS, { error: 'Choose US or UK terms.' }),
  theme: z.enum(THEMES, { error: 'Choose system, light or dark.' }),
  currency: currencySchema,
});
export type Preferences = z.output<typeof preferencesSchema>;

/** A change names only the preferences that change, and at least one. */
export const preferencesChangeSchema = preferencesSchema
  .partial()
  .refine((change) => Object.keys(change).length > 0, { error: 'Name at least one preference.' });
export type PreferencesChange = z.output<typeof preferencesChangeSchema>;

export const DEFAULT_PREFERENCES: Preferences = {
  units: 'metric',
  terms: 'us',
  theme: 'system',
  currency: 'EUR',
};
