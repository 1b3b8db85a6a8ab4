/** What shows between the strands of a yarn, as CSS. */
export const shadeOf = (hex: string): string => `color-mix(in oklab, ${hex} 62%, #10181a)`;
