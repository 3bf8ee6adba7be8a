/** What a "How this is worked out" says of one derived figure. */
export interface Workings {
  formula: string;
  inputs: readonly { name: string; value: string }[];
  source: string;
  limits: readonly string[];
  /** Name of its page below /method. */
  method: string;
}

export const METHOD_PATH = '/method';
