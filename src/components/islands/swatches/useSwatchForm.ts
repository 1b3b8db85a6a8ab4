import { createSwatch, swatchContent, updateSwatch } from '../../../client/queries/swatches';
import { swatchInput, type PresentedSwatch, type SwatchInput } from '../../../schemas/swatch';
import { useVersionedForm } from '../form/useVersionedForm';

/** A swatch being written. */
export const useSwatchForm = (initial: PresentedSwatch | null, blank: SwatchInput) =>
  useVersionedForm<SwatchInput, PresentedSwatch>({
    schema: swatchInput,
    initial,
    blank,
    valuesOf: swatchContent,
    save: (values, from) =>
      from ? updateSwatch(from.id, from.version, values) : createSwatch(values),
    // The address of a new swatch exists only now; what follows begins there.
    onSaved: ({ id }, wasNew) => wasNew && window.location.replace(`/swatches/${id}`),
  });
