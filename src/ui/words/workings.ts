import { dateWords } from '#src/ui/words/dateWords.ts';
import { intervalWords, plainNumber, signedNumber } from '#src/ui/words/numberWords.ts';
import { withUnit } from '#src/ui/words/valueWords.ts';

interface Compared {
  testName: string;
  unit: string;
  leadMean: number;
  trailMean: number;
  leadN: number;
  trailN: number;
  typicalErrorPct: { lead: number; trail: number } | null;
  difference: number;
  interval: readonly [number, number] | null;
}

/** How the difference between two legs was worked out, with this athlete's own inputs. */
export function pushWorkings(compared: Compared, name: string) {
  const { testName, unit, leadMean, trailMean, leadN, trailN, typicalErrorPct, difference, interval } = compared;
  return {
    formula: '100 × (lead − trail) ÷ the larger; standard error (smaller ÷ larger) × √(TE lead² + TE trail²)',
    inputs: [
      { name: `${testName} of ${name}, lead`, value: `${withUnit(leadMean, unit)}, mean of ${leadN}` },
      { name: 'trail', value: `${withUnit(trailMean, unit)}, mean of ${trailN}` },
      ...(typicalErrorPct
        ? [
            {
              name: 'typical error between days, lead and trail',
              value: `${plainNumber(typicalErrorPct.lead, 1)} % and ${plainNumber(typicalErrorPct.trail, 1)} %`,
            },
          ]
        : []),
      {
        name: 'difference',
        value: `${signedNumber(difference, 1)} %${interval ? `, 90 % interval ${intervalWords(interval, 1)} %` : ''}`,
      },
    ],
    source:
      'Difference in per cent of the larger leg (one of the indices that Bishop and others collected, 2016). Typical error between days: our own rule from the test’s published variation and 2.5 % from day to day.',
    limits: [
      'One test on one day never settles which side is weaker.',
      'Golf is played from one side: a stronger lead leg is expected and is not a fault.',
    ],
    method: 'asymmetry',
  };
}

interface Carried {
  heldOn: string;
  carryM: number;
  measuredM: number | null;
  interval: readonly [number, number] | null;
  drives: number;
  temperatureC: number | null;
  windMps: number | null;
}

/** How the standard carry of a session was worked out. */
export function carryWorkings({ heldOn, carryM, measuredM, interval, drives, temperatureC, windMps }: Carried) {
  return {
    formula:
      'each drive: measured carry × modelled carry in standard air ÷ modelled carry in that day’s air; then the median of the drives; 90 % interval from the scaled median deviation',
    inputs: [
      { name: 'session', value: `${dateWords(heldOn)}, ${drives} counted drives` },
      ...(measuredM === null ? [] : [{ name: 'median carry that day', value: `${plainNumber(measuredM, 1)} m` }]),
      {
        name: 'air',
        value: `${temperatureC === null ? 'temperature not noted' : `${plainNumber(temperatureC)} °C`}, wind along ${windMps === null ? 'not noted' : `${plainNumber(windMps, 1)} m/s`}`,
      },
      {
        name: 'standard carry',
        value: `${plainNumber(carryM, 1)} m${interval ? `, 90 % interval ${intervalWords(interval, 1)} m` : ''}`,
      },
    ],
    source:
      'Flight: Smits and Smith 1994, spin decay after Penner 2001. Air: CIPM-2007. Standard air: 20 °C, 101 325 Pa, 50 % humidity, no wind.',
    limits: [
      'The model serves to compare days, never to predict how far a child hits it.',
      'Cold balls and cold hands cost more than the air alone.',
    ],
    method: 'carry-standard',
  };
}

interface Velocity {
  from: string;
  on: string;
  perYear: number | null;
  standardError: number | null;
  days: number | null;
}

/** How a growth velocity was worked out. */
export function velocityWorkings({ from, on, perYear, standardError, days }: Velocity) {
  return {
    formula: '(last height − first height) ÷ years between; standard error √2 × 0.3 cm ÷ years',
    inputs: [
      { name: 'from and to', value: `${dateWords(from)} to ${dateWords(on)}, ${days ?? 0} days` },
      {
        name: 'velocity',
        value:
          perYear === null
            ? 'not given'
            : `${plainNumber(perYear, 1)} cm a year, standard error ${plainNumber(standardError ?? 0, 1)}`,
      },
    ],
    source: 'Measurement error of 0.3 cm a height: common practice. Reference velocities: Abbassi 1998.',
    limits: ['Less than about five months apart, the tape’s own error is as large as a spurt.'],
    method: 'growth-velocity',
  };
}

/** How a lead share was worked out. */
export function shareWorkings(swings: number) {
  return {
    formula: '100 × lead ÷ (lead + trail), at each event by linear interpolation between samples',
    inputs: [{ name: 'swings', value: `${swings}, their mean at each event` }],
    source:
      'Two styles and their events: Ball and Best 2007, in 62 golfers. Style here is the sign of impact minus early downswing.',
    limits: [
      'Neither style is an error: both are found from professionals to beginners.',
      'Pressure is not mass: the trace does not say where the body went.',
    ],
    method: 'ground-trace',
  };
}
