import { trueBody, trueLegs } from '#db/seed/body.ts';
import type { Random } from '#db/seed/random.ts';
import { inTerm, TERMS, type Truth } from '#db/seed/truth.ts';
import { airDensity } from '#src/domain/driver/airDensity.ts';
import { flight } from '#src/domain/driver/flight.ts';

export interface GeneratedShot {
  club: 'driver' | 'other';
  clubLabel: string;
  clubSpeedMps: number;
  ballSpeedMps: number;
  launchDeg: number;
  spinRpm: number;
  attackDeg: number | null;
  carryM: number;
  offlineM: number;
}

const LAUNCH_DEG = 12.5;
const SPIN_RPM = 2750;
const BALL_OVER_CLUB = 1.44;

/** Carry that growth, both legs and what was found beside them bring this athlete in a term, standard conditions, m. */
export function trueCarryM(truth: Truth, term: number): number {
  const strength = (t: number) => (trueLegs(truth, t).lead + trueLegs(truth, t).trail) / 2;
  const stature = (t: number) => trueBody(truth, TERMS[t]!.testedOn).statureM;
  const years = (Date.parse(TERMS[term]!.droveOn) - Date.parse(TERMS[0].droveOn)) / 31_557_600_000;
  const extra = Array.from({ length: term + 1 }, (_, t) => inTerm(truth.extraCarryPct, t));
  return (
    truth.carryM *
    (strength(term) / strength(0)) ** 0.55 *
    (stature(term) / stature(0)) ** 0.9 *
    1.02 ** years *
    extra.reduce((product, pct) => product * (1 + pct / 100), 1)
  );
}

/** One athlete's shots of a session: drives, a few irons, now and then a mishit. */
export function generateShots(truth: Truth, term: number, random: Random): GeneratedShot[] {
  const { temperatureC, pressurePa, windMps } = TERMS[term]!;
  const { density } = airDensity({ temperatureC, pressurePa });
  const ball = ballSpeedFor(trueCarryM(truth, term) * (1 + random.normal(0, 0.012)));
  const shots = 7 + Math.floor(random.next() * 4);
  return Array.from({ length: shots }, (_, i) => {
    const iron = i % 5 === 3 && random.chance(0.7);
    const ballSpeedMps = (iron ? 0.74 * ball : ball) * (1 + random.normal(0, 0.017));
    const clubSpeedMps = (ballSpeedMps / (iron ? 1.31 : BALL_OVER_CLUB)) * (1 + random.normal(0, 0.008));
    const launchDeg = random.normal(iron ? 18 : LAUNCH_DEG, 1.7);
    const spinRpm = random.normal(iron ? 5500 : SPIN_RPM, 240);
    const flown = flight({ ballSpeed: ballSpeedMps, launchDeg, spinRpm, density, wind: windMps }).carry;
    const mishit = !iron && random.chance(0.035);
    return {
      club: iron ? 'other' : 'driver',
      clubLabel: iron ? '7 iron' : 'Driver',
      clubSpeedMps,
      ballSpeedMps,
      launchDeg,
      spinRpm,
      attackDeg: random.chance(0.06) ? null : random.normal(iron ? -3 : inTerm(truth.attackDeg, term), 0.8),
      carryM: (flown ?? 0) * (mishit ? 0.33 : 1 + random.normal(0, 0.012)),
      offlineM: random.normal(0, 8),
    };
  });
}

/** Ball speed whose modelled carry in standard air is this, by halving. */
function ballSpeedFor(carryM: number): number {
  let [low, high] = [20, 90];
  while (high - low > 0.02) {
    const middle = (low + high) / 2;
    const carry = flight({ ballSpeed: middle, launchDeg: LAUNCH_DEG, spinRpm: SPIN_RPM }).carry ?? 0;
    if (carry < carryM) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
