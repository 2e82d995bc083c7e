import { z } from 'zod';

/** Shapes of words and figures that every block of a sheet is made of. */
export const text = z.string().trim().min(1).max(600);
export const line = z.string().trim().min(1).max(160);
/** YAML reads 3 as a number and "3 %" as text; both are quantities. */
export const figure = z.union([z.number(), z.string().trim().min(1).max(40)]).transform(String);
export const name = z
  .string()
  .regex(/^[a-z][A-Za-z0-9]{0,23}$/, 'a name is letters and digits, beginning with a small letter');
export const partId = z.string().regex(/^[a-h]$/, 'parts are lettered a to h');
export const sum = z.string().max(300);
export const figures = z.int().min(1).max(6);
