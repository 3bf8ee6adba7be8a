import { CALCULATOR_NAMES, type CalculatorName } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS } from '#src/services/method/calculators.ts';
import { METHOD_GROUPS, type MethodGroup } from '#src/services/method/methodPage.ts';

/** One calculator in a list. */
export interface ListedCalculator {
  name: CalculatorName;
  title: string;
  group: MethodGroup;
  sentence: string;
}

/** All calculators, in the order of the groups. */
export function listCalculators(): ListedCalculator[] {
  return METHOD_GROUPS.flatMap((group) =>
    CALCULATOR_NAMES.filter((name) => CALCULATORS[name].page.group === group).map((name) => {
      const { title, sentence } = CALCULATORS[name].page;
      return { name, title, group, sentence };
    }),
  );
}
