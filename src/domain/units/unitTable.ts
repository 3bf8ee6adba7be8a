/** What a unit measures. */
export type Quantity = 'force' | 'length' | 'speed' | 'mass' | 'angle' | 'rate' | 'time' | 'temperature' | 'pressure';

/**
 * One unit: base value = (value + `offset`) · `factor`.
 * `symbol` is how the product writes it; `spellings` are how files write it, in lower case without spaces.
 */
export interface Unit {
  symbol: string;
  quantity: Quantity;
  factor: number;
  offset: number;
  spellings: readonly string[];
}

const unit = (quantity: Quantity, symbol: string, factor: number, spellings: string[], offset = 0): Unit =>
  Object.freeze({ symbol, quantity, factor, offset, spellings: Object.freeze(spellings) });

/** The unit in which the product keeps each quantity: SI, but degrees, revolutions a minute and degrees Celsius. */
export const BASE_SYMBOL: Readonly<Record<Quantity, string>> = Object.freeze({
  force: 'N',
  length: 'm',
  speed: 'm/s',
  mass: 'kg',
  angle: 'deg',
  rate: 'rpm',
  time: 's',
  temperature: '°C',
  pressure: 'Pa',
});

const GRAVITY_STANDARD = 9.80665;
const POUND_KG = 0.45359237;
const FOOT_M = 0.3048;
const MERCURY_DENSITY = 13595.1;

/**
 * Every unit that the product reads. Factors are exact by definition: international yard and pound (1959),
 * standard gravity 9.80665 m/s² (CGPM 1901), conventional mercury 13595.1 kg/m³ for inHg.
 */
export const UNITS: readonly Unit[] = Object.freeze([
  unit('force', 'N', 1, ['n', 'newton', 'newtons']),
  unit('force', 'kgf', GRAVITY_STANDARD, ['kgf', 'kg-f', 'kilogram-force', 'kilogramforce', 'kp']),
  unit('force', 'lbf', POUND_KG * GRAVITY_STANDARD, ['lbf', 'lb-f', 'lbsf', 'pound-force', 'poundforce']),
  unit('length', 'm', 1, ['m', 'metre', 'metres', 'meter', 'meters', 'mtr', 'mtrs']),
  unit('length', 'cm', 0.01, ['cm', 'cms', 'centimetre', 'centimetres', 'centimeter', 'centimeters']),
  unit('length', 'mm', 0.001, ['mm', 'millimetre', 'millimetres', 'millimeter', 'millimeters']),
  unit('length', 'in', 0.0254, ['in', 'ins', 'inch', 'inches', '"', '″', '”', "''"]),
  unit('length', 'ft', FOOT_M, ['ft', 'foot', 'feet', "'", '′', '’']),
  unit('length', 'yd', 0.9144, ['yd', 'yds', 'yard', 'yards']),
  unit('speed', 'm/s', 1, ['m/s', 'mps', 'm/sec', 'ms-1', 'm·s-1', 'm.s-1', 'metrespersecond', 'meterspersecond']),
  unit('speed', 'mph', 0.44704, ['mph', 'mi/h', 'miles/h', 'milesperhour']),
  unit('speed', 'km/h', 1 / 3.6, ['km/h', 'kmh', 'kph', 'km/hr', 'kmph', 'kilometresperhour', 'kilometersperhour']),
  unit('speed', 'ft/s', FOOT_M, ['ft/s', 'ft/sec', 'feetpersecond']),
  unit('mass', 'kg', 1, ['kg', 'kgs', 'kilo', 'kilos', 'kilogram', 'kilograms', 'kilogramme', 'kilogrammes']),
  unit('mass', 'lb', POUND_KG, ['lb', 'lbs', 'lbm', 'pound', 'pounds']),
  unit('mass', 'g', 0.001, ['g', 'gr', 'gram', 'grams', 'gramme', 'grammes']),
  unit('angle', 'deg', 1, ['deg', 'degs', 'degree', 'degrees', '°', 'º']),
  unit('rate', 'rpm', 1, ['rpm', 'rev/min', 'revs/min', 'r/min', '1/min', 'min-1', 'revolutionsperminute']),
  unit('time', 's', 1, ['s', 'sec', 'secs', 'second', 'seconds']),
  unit('time', 'ms', 0.001, ['ms', 'msec', 'msecs', 'millisecond', 'milliseconds']),
  unit('temperature', '°C', 1, ['°c', 'ºc', 'c', 'degc', 'celsius', 'degreescelsius', 'centigrade']),
  unit('temperature', '°F', 5 / 9, ['°f', 'ºf', 'f', 'degf', 'fahrenheit', 'degreesfahrenheit'], -32),
  unit('pressure', 'Pa', 1, ['pa', 'pascal', 'pascals']),
  unit('pressure', 'hPa', 100, ['hpa', 'hectopascal', 'hectopascals']),
  unit('pressure', 'kPa', 1000, ['kpa', 'kilopascal', 'kilopascals']),
  unit('pressure', 'mbar', 100, ['mbar', 'mb', 'millibar', 'millibars']),
  unit('pressure', 'inHg', MERCURY_DENSITY * GRAVITY_STANDARD * 0.0254, ['inhg', '"hg', 'inchesofmercury']),
]);
