/** Standard normal quantile at .95: the half-width of a two-sided 90 % interval in standard errors. */
export const Z90 = 1.6448536269514722;
