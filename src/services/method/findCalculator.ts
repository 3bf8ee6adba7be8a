import { isCalculatorName } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS, type Calculator } from '#src/services/method/calculators.ts';

/** The calculator of this name, if there is one. */
export const findCalculator = (name: string | undefined): Calculator | undefined =>
  isCalculatorName(name) ? CALCULATORS[name] : undefined;
