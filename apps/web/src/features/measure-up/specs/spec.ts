import type { MeasureUpView } from '@linkfell/contracts';
import type { ReactNode } from 'react';

/** What a form holds while it is typed: text only, so that nothing typed is ever lost or corrected. */
export type Raw = Record<string, string>;

export type FieldSpec =
  | {
      type: 'number';
      name: string;
      label: string;
      hint?: string;
      units: readonly string[];
      optional?: boolean;
    }
  | {
      type: 'choice';
      name: string;
      label: string;
      hint?: string;
      layout?: 'list' | 'row' | 'cards';
      choices: readonly { value: string; label: string; hint?: string; figure?: ReactNode }[];
    }
  | { type: 'text'; name: string; label: string; hint?: string; optional?: boolean }
  | { type: 'check'; name: string; label: string; hint?: string }
  | {
      type: 'select';
      name: string;
      label: string;
      hint?: string;
      options: readonly { value: string; label: string }[];
    }
  | { type: 'town'; name: string; label: string; hint?: string };

/** One question of the measure-up: its words, its fields, and how its answer is read from them. */
export interface QuestionSpec {
  title: string;
  lead?: string;
  fields: (raw: Raw, view: MeasureUpView) => readonly FieldSpec[];
  /** The answer for the contract's schema; what cannot be read is left undefined, and the schema says so. */
  toValue: (raw: Raw) => unknown;
  /** The form for an answer given earlier. */
  fromValue: (value: never) => Raw;
  start?: Raw;
  /** What follows from "I don't know"; null where everybody knows. */
  unknown: string | null;
  /** Where to find it and how to measure it. */
  where?: ReactNode;
  cautions?: readonly string[];
  drawing?: (raw: Raw, view: MeasureUpView) => ReactNode;
  /** In few words, for the list of all answers. */
  summary: (value: never) => string;
}

/** Gives a spec its own answer type while the registry stays one list. */
export const question = <Value>(
  spec: Omit<QuestionSpec, 'fromValue' | 'summary'> & {
    fromValue: (value: Value) => Raw;
    summary: (value: Value) => string;
  },
): QuestionSpec => spec as unknown as QuestionSpec;
