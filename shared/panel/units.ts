/** Small zod building blocks of the panel file: numbers with a range, tags, texts a person typed. */
import { z } from 'zod';

// Control characters and bidirectional overrides could make a label show something other than what it says.
const forbidden = /[\p{Cc}\u200e\u200f\u202a-\u202e\u2066-\u2069]/u;

/** A line of text a person reads: trimmed, no control or bidirectional characters, at most `max` characters. */
export const text = (max: number) =>
  z
    .string()
    .trim()
    .min(1)
    .max(max)
    .refine((value) => !forbidden.test(value), { error: 'holds a control or direction character' });

/** The name of a thing on the drawing ("Q1", "-X3", "=A1+K2"): up to 40 characters. */
export const tag = text(40);

export const positive = z.number().positive();
export const nonNegative = z.number().nonnegative();
export const percent = z.number().min(0).max(100);
