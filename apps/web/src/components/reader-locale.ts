/** Numbers are shown as the reader writes them; exports always use a decimal point. */
export const readerLocale = (): string => (typeof navigator === 'undefined' ? 'en' : navigator.language || 'en');

/** The face holds the Greek mu alone: the micro sign is shown by it. */
export const shownUnit = (unit: string): string => unit.replaceAll('\u00b5', '\u03bc');
