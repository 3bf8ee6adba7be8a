import type { FormField } from '#src/schemas/method/form/formField.ts';

/** How sure a figure's source is. */
export type SourceTag = 'read' | 'recomputed' | 'memory' | 'proposal' | 'practice';

/** What the tags say on a page. */
export const TAG_WORDS: Readonly<Record<SourceTag, string>> = {
  read: 'read in its source',
  recomputed: 'exact, or recomputed independently',
  memory: 'from memory, to be verified',
  proposal: 'our own proposal, no published cut-off',
  practice: 'common practice, no source',
};

/** The parts of the Method, in the order of the list. */
export const METHOD_GROUPS = ['Two legs', 'Numbers', 'Force', 'Growth', 'Driver', 'Load', 'Decisions'] as const;
export type MethodGroup = (typeof METHOD_GROUPS)[number];

/** A value that the worked example must give, and where it is printed. */
export interface PublishedValue {
  /** Its place in the response, as in `interval90.0`. */
  path: string;
  value: number | string | boolean | null;
  /** Allowed relative difference (absolute where the value is 0). */
  tolerance: number;
  source: string;
}

/** A table of words on a calculator's page; the first cell of a row names it. */
interface MethodTable {
  title: string;
  /** A sentence above it. */
  says: string;
  columns: readonly { header: string; numeric?: boolean }[];
  rows: readonly (readonly string[])[];
}

/** The words of one calculator's page. */
export interface MethodPage {
  title: string;
  group: MethodGroup;
  /** What it answers, in one sentence. */
  sentence: string;
  /** What it is for, a paragraph each. */
  purpose: readonly string[];
  /** Formulas as TeX, each with the words that say what it is. */
  formulas: readonly { says: string; tex: string }[];
  /** What does not fit into a formula. */
  tables?: readonly MethodTable[];
  sources: readonly { of: string; source: string; tag: SourceTag }[];
  limits: readonly string[];
  fields: readonly FormField[];
  /** Names and units of the response's figures by path; `*` stands for any index, an empty name leaves a part out. */
  outputs: Readonly<Record<string, string>>;
  example: { says: string; request: object; published: readonly PublishedValue[] };
}
