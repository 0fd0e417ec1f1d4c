import { parseFrequency, parseLevel, parseTypedNumber } from '@leeside/units/parse-quantity';
import { z } from 'zod';

const read = (parse: (text: string) => number | null, message: string) =>
  z.string().transform((text, context) => {
    const value = parse(text);
    if (value !== null) return value;
    context.addIssue({ code: 'custom', message: `${message} Found “${text}”.` });
    return z.NEVER;
  });

const required = (schema: z.ZodType<number, string>, message: string): z.ZodType<number, string> =>
  z.string().trim().min(1, message).pipe(schema);

/** A frequency typed as "2.4 GHz", "2,4 GHz" or "433.92M"; hertz without a unit. */
export const typedFrequency = (name: string) =>
  required(read(parseFrequency, `${name} must be a frequency such as 433.92 MHz.`), `${name} is missing. Write for example 433.92 MHz.`);

/** A level typed as "-31 dBm" or "−31,5"; the unit may be left out. */
export const typedLevel = (name: string, unit: string, example = '\u221231') =>
  required(read((text) => parseLevel(text, unit), `${name} must be a number in ${unit}.`), `${name} is missing. Write for example ${example} ${unit}.`);

/** The same, or nothing. */
export const optionalLevel = (name: string, unit: string) =>
  z.union([z.string().trim().length(0).transform((): undefined => undefined), read((text) => parseLevel(text, unit), `${name} must be a number in ${unit}.`)]);

/** A plain number with its range, or nothing. */
export const optionalNumber = (name: string, least: number, most: number) =>
  z.union([
    z.string().trim().length(0).transform((): undefined => undefined),
    read((text) => {
      const value = parseTypedNumber(text);
      return value !== null && value >= least && value <= most ? value : null;
    }, `${name} must be a number from ${String(least)} to ${String(most)}.`),
  ]);
