import { dateWords } from '#src/ui/words/dateWords.ts';
import { plainNumber } from '#src/ui/words/numberWords.ts';
import { withUnit } from '#src/ui/words/valueWords.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

interface Compared {
  testName: string;
  unit: string;
  heldOn: string;
  leadMean: number;
  trailMean: number;
}

interface Figures {
  header: {
    givenName: string;
    leadSide: 'left' | 'right';
    velocity: { perYear: number | null; standardError: number | null } | null;
  };
  carry: readonly { heldOn: string; carryM: number; interval: readonly [number, number] | null }[];
  newest: readonly Compared[];
}

/**
 * The record in plain words for a family: what was measured, never what the coaches make of it. Each sentence stands
 * alone; none compares the child with another.
 */
export function plainWords({ header, carry, newest }: Figures, who: 'child' | 'self'): string[] {
  const name = who === 'self' ? 'you' : header.givenName;
  return [
    aboutCarry(name, carry),
    ...aboutLegs(name, header.leadSide, newest),
    aboutGrowth(name, header.velocity),
  ].filter((sentence) => sentence !== '');
}

function aboutCarry(name: string, carry: Figures['carry']): string {
  const [first, last] = [carry[0], carry.at(-1)];
  if (!first || !last) return '';
  const half = ({ interval }: Figures['carry'][number]) => (interval ? (interval[1] - interval[0]) / 2 : 0);
  const how = `about ${plainNumber(last.carryM)} m through the air on a still, mild day`;
  const now = `On ${dateWords(last.heldOn)} ${name} carried the driver ${how}`;
  if (first === last) return `${now}.`;
  const change = last.carryM - first.carryM;
  const noise = Math.hypot(half(first), half(last));
  const since = dateWords(first.heldOn);
  return Math.abs(change) <= noise
    ? `${now}, much the same as on ${since}.`
    : `${now}, ${plainNumber(Math.abs(change))} m ${change > 0 ? 'further' : 'shorter'} than on ${since}, give or take ${plainNumber(noise)} m.`;
}

function aboutLegs(name: string, leadSide: 'left' | 'right', newest: readonly Compared[]): string[] {
  if (newest.length === 0) return [];
  const trailSide = leadSide === 'left' ? 'right' : 'left';
  const nearer = `The ${leadSide} leg is the one nearer the target.`;
  const push = newest.find(({ unit }) => unit === 'N') ?? newest[0]!;
  const said = `At the test of ${dateWords(push.heldOn)} (${push.testName.toLowerCase()}) ${name} reached ${withUnit(push.leadMean, push.unit)} with the ${leadSide} leg and ${withUnit(push.trailMean, push.unit)} with the ${trailSide}.`;
  return [said, nearer];
}

function aboutGrowth(name: string, velocity: Figures['header']['velocity']): string {
  if (!velocity || velocity.perYear === null || velocity.standardError === null) return '';
  const verb = name === 'you' ? 'You are' : `${name} is`;
  return `${verb} growing ${plainNumber(velocity.perYear, 1)} cm a year, give or take ${plainNumber(Z90 * velocity.standardError, 1)} cm.`;
}
