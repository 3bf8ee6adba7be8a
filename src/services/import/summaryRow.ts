const WHOLE =
  /^((squad|team|group|session|player|overall|class)['’]?s? )?(averages?|avg\.?|ave\.?|means?|medians?|totals?|sums?|s\.?d\.?|std\.?( ?dev\.?)?|stdev|standard deviation|max(imum)?|min(imum)?|summary|range|count|consistency|best)( of .*| ?\(.*\))?:?$/i;
const IN_HEADING =
  /\b(mean|avg|average|ave|best|max|maximum|min|minimum|median|sd|cv|asymmetry|asym|diff|difference|lsi|total|sum|ratio|index|bw|kg)\b/;

/** Whether a cell says that its row sums others up: `Average`, `Squad mean`, `Std dev`. */
export const isSummaryLabel = (text: string): boolean => WHOLE.test(text.trim());

/** Whether a heading says that its column is worked out from others: `jump L mean (cm)`. */
export const isSummaryHeading = (name: string): boolean => IN_HEADING.test(name);
