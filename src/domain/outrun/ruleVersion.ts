/** Version of the rule's fixed parts: windows, swing minima, the clearing rule. Kept with each judgement. */
export const RULE_VERSION = '1';
