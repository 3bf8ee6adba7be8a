import { agreement } from '#src/domain/reliability/agreement.ts';
import { airDensity } from '#src/domain/driver/airDensity.ts';
import { asymmetry } from '#src/domain/asymmetry/asymmetry.ts';
import { care } from '#src/domain/care/care.ts';
import { flight } from '#src/domain/driver/flight.ts';
import { groundTrace } from '#src/domain/ground/groundTrace.ts';
import { growthCentile, type GrowthCentileInput } from '#src/domain/growth/growthCentile.ts';
import { growthVelocity } from '#src/domain/growth/growthVelocity.ts';
import { jumpCurve } from '#src/domain/jump/jumpCurve.ts';
import { jumpHeight, type JumpHeightInput } from '#src/domain/jump/jumpHeight.ts';
import { maturity } from '#src/domain/growth/maturity.ts';
import { oneRepMax } from '#src/domain/load/oneRepMax.ts';
import { outrun } from '#src/domain/outrun/outrun.ts';
import { pushCurve } from '#src/domain/push/pushCurve.ts';
import { reliability } from '#src/domain/reliability/reliability.ts';
import { sessionLoad } from '#src/domain/load/sessionLoad.ts';
import { speedRatio } from '#src/domain/driver/speedRatio.ts';
import { trend } from '#src/domain/trend/trend.ts';
import { weekChange } from '#src/domain/load/weekChange.ts';
import type { z } from 'zod';
import type { CalculatorName } from '#src/schemas/method/calculatorNames.ts';
import { agreementRequest } from '#src/schemas/method/agreement.ts';
import { airDensityRequest } from '#src/schemas/method/air.ts';
import { asymmetryRequest } from '#src/schemas/method/asymmetry.ts';
import { careRequest } from '#src/schemas/method/care.ts';
import { carryStandardRequest } from '#src/schemas/method/carryStandard.ts';
import { flightRequest } from '#src/schemas/method/flight.ts';
import { groundTraceRequest } from '#src/schemas/method/groundTrace.ts';
import { growthCentileRequest } from '#src/schemas/method/growthCentile.ts';
import { growthVelocityRequest } from '#src/schemas/method/growthVelocity.ts';
import { jumpCurveRequest } from '#src/schemas/method/jumpCurve.ts';
import { jumpHeightRequest } from '#src/schemas/method/jumpHeight.ts';
import { maturityRequest } from '#src/schemas/method/maturity.ts';
import { oneRepMaxRequest } from '#src/schemas/method/oneRepMax.ts';
import { outrunRequest } from '#src/schemas/method/outrun.ts';
import { pushCurveRequest } from '#src/schemas/method/pushCurve.ts';
import { reliabilityRequest } from '#src/schemas/method/reliability.ts';
import { sessionLoadRequest } from '#src/schemas/method/sessionLoad.ts';
import { speedRatioRequest } from '#src/schemas/method/speedRatio.ts';
import { trendRequest } from '#src/schemas/method/trend.ts';
import { weekChangeRequest } from '#src/schemas/method/weekChange.ts';
import { agreementPage } from '#src/services/method/content/agreement.ts';
import { airDensityPage } from '#src/services/method/content/airDensity.ts';
import { asymmetryPage } from '#src/services/method/content/asymmetry.ts';
import { carePage } from '#src/services/method/content/care.ts';
import { carryStandardPage } from '#src/services/method/content/carryStandard.ts';
import { flightPage } from '#src/services/method/content/flight.ts';
import { groundTracePage } from '#src/services/method/content/groundTrace.ts';
import { growthCentilePage } from '#src/services/method/content/growthCentile.ts';
import { growthVelocityPage } from '#src/services/method/content/growthVelocity.ts';
import { jumpCurvePage } from '#src/services/method/content/jumpCurve.ts';
import { jumpHeightPage } from '#src/services/method/content/jumpHeight.ts';
import { maturityPage } from '#src/services/method/content/maturity.ts';
import { oneRepMaxPage } from '#src/services/method/content/oneRepMax.ts';
import { outrunPage } from '#src/services/method/content/outrun.ts';
import { pushCurvePage } from '#src/services/method/content/pushCurve.ts';
import { reliabilityPage } from '#src/services/method/content/reliability.ts';
import { sessionLoadPage } from '#src/services/method/content/sessionLoad.ts';
import { speedRatioPage } from '#src/services/method/content/speedRatio.ts';
import { trendPage } from '#src/services/method/content/trend.ts';
import { weekChangePage } from '#src/services/method/content/weekChange.ts';
import { carryStandardInParts } from '#src/services/method/carryStandardInParts.ts';
import type { MethodPage } from '#src/services/method/methodPage.ts';

/** A pure function of the domain with the schema of its requests and the words of its page. */
export interface Calculator {
  schema: z.ZodType;
  /** Takes what the schema has passed, and nothing else. */
  run: (input: unknown) => object | Promise<object>;
  page: MethodPage;
}

function calculator<S extends z.ZodType>(
  schema: S,
  run: (input: z.output<S>) => object | Promise<object>,
  page: MethodPage,
): Calculator {
  return { schema, run: (input) => run(input as z.output<S>), page };
}

/** Every calculator of the Method API, one a row of its contract. */
export const CALCULATORS: Readonly<Record<CalculatorName, Calculator>> = {
  asymmetry: calculator(asymmetryRequest, asymmetry, asymmetryPage),
  agreement: calculator(agreementRequest, agreement, agreementPage),
  reliability: calculator(reliabilityRequest, reliability, reliabilityPage),
  trend: calculator(trendRequest, trend, trendPage),
  // The schema has seen to it that exactly one of the alternatives is there.
  'jump-height': calculator(jumpHeightRequest, (input) => jumpHeight(input as JumpHeightInput), jumpHeightPage),
  'jump-curve': calculator(jumpCurveRequest, jumpCurve, jumpCurvePage),
  'push-curve': calculator(pushCurveRequest, pushCurve, pushCurvePage),
  maturity: calculator(maturityRequest, maturity, maturityPage),
  'growth-velocity': calculator(growthVelocityRequest, growthVelocity, growthVelocityPage),
  'growth-centile': calculator(
    growthCentileRequest,
    (input) => growthCentile(input as GrowthCentileInput),
    growthCentilePage,
  ),
  'air-density': calculator(airDensityRequest, airDensity, airDensityPage),
  flight: calculator(flightRequest, flight, flightPage),
  'carry-standard': calculator(carryStandardRequest, carryStandardInParts, carryStandardPage),
  'speed-ratio': calculator(speedRatioRequest, speedRatio, speedRatioPage),
  'ground-trace': calculator(groundTraceRequest, groundTrace, groundTracePage),
  'session-load': calculator(sessionLoadRequest, sessionLoad, sessionLoadPage),
  'week-change': calculator(weekChangeRequest, weekChange, weekChangePage),
  'one-rep-max': calculator(oneRepMaxRequest, oneRepMax, oneRepMaxPage),
  outrun: calculator(outrunRequest, outrun, outrunPage),
  // No level means: carry on. It is never unknown, so there is no reason to give.
  care: calculator(careRequest, (input) => ({ ...care(input), reason: null }), carePage),
};
