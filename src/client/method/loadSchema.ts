import '#src/client/method/withoutEval.ts';
import type { z } from 'zod';
import type { CalculatorName } from '#src/schemas/method/calculatorNames.ts';

/** Each calculator's schema in a file of its own, so that a page fetches one. */
const LOADERS: Readonly<Record<CalculatorName, () => Promise<z.ZodType>>> = {
  asymmetry: async () => (await import('#src/schemas/method/asymmetry.ts')).asymmetryRequest,
  agreement: async () => (await import('#src/schemas/method/agreement.ts')).agreementRequest,
  reliability: async () => (await import('#src/schemas/method/reliability.ts')).reliabilityRequest,
  trend: async () => (await import('#src/schemas/method/trend.ts')).trendRequest,
  'jump-height': async () => (await import('#src/schemas/method/jumpHeight.ts')).jumpHeightRequest,
  'jump-curve': async () => (await import('#src/schemas/method/jumpCurve.ts')).jumpCurveRequest,
  'push-curve': async () => (await import('#src/schemas/method/pushCurve.ts')).pushCurveRequest,
  maturity: async () => (await import('#src/schemas/method/maturity.ts')).maturityRequest,
  'growth-velocity': async () => (await import('#src/schemas/method/growthVelocity.ts')).growthVelocityRequest,
  'growth-centile': async () => (await import('#src/schemas/method/growthCentile.ts')).growthCentileRequest,
  'air-density': async () => (await import('#src/schemas/method/air.ts')).airDensityRequest,
  flight: async () => (await import('#src/schemas/method/flight.ts')).flightRequest,
  'carry-standard': async () => (await import('#src/schemas/method/carryStandard.ts')).carryStandardRequest,
  'speed-ratio': async () => (await import('#src/schemas/method/speedRatio.ts')).speedRatioRequest,
  'ground-trace': async () => (await import('#src/schemas/method/groundTrace.ts')).groundTraceRequest,
  'session-load': async () => (await import('#src/schemas/method/sessionLoad.ts')).sessionLoadRequest,
  'week-change': async () => (await import('#src/schemas/method/weekChange.ts')).weekChangeRequest,
  'one-rep-max': async () => (await import('#src/schemas/method/oneRepMax.ts')).oneRepMaxRequest,
  outrun: async () => (await import('#src/schemas/method/outrun.ts')).outrunRequest,
  care: async () => (await import('#src/schemas/method/care.ts')).careRequest,
};

/** The schema that the route of this calculator parses with. */
export const loadSchema = (name: CalculatorName): Promise<z.ZodType> => LOADERS[name]();
