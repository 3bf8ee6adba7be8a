import { changedInput, type Change } from '#src/domain/outrun/changedInput.ts';
import { pairsInOrder } from '#src/domain/outrun/divergenceRaw.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import { impossibleBefore, type WhatIsKnown } from '#src/domain/outrun/impossibleBefore.ts';
import { judgeCriteria } from '#src/domain/outrun/judgeCriteria.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { plainDate } from '#src/domain/outrun/plainDate.ts';
import { smallestChanges } from '#src/domain/outrun/smallestChanges.ts';
import { mean } from '#src/domain/statistics/mean.ts';

/** What the summaries do not hold: the dates, and the lead leg's present mean in each test, to name it. */
export interface ClearsWhenDetails extends WhatIsKnown {
  /** date of the judgement, YYYY-MM-DD; default that of the input, where it is a date */
  asOf?: string;
  /** `figure` decimals and unit as shown, for example push, 510, ' N', 0 */
  newestLead?: readonly { test: string; mean: number; unit: string; decimals: number }[];
}

/**
 * What would clear an outrun: the smallest changes after which there is no level and at most one point, each as a
 * plain sentence, found by judging the changed input again; then the date before which data already taken make it
 * impossible, where dates are known, and what else a clearing needs.
 *
 * @returns sentences; none where there is no level
 * @throws {RangeError} if a figure of any block is out of range
 */
export function clearsWhen(input: OutrunInput, details: ClearsWhenDetails = {}): string[] {
  if (judgeCriteria(input).level === null) return [];
  const changes = smallestChanges(input);
  const sentences = changes.map((change) => changeSentence(input, change, details));
  if (changes.length === 0)
    sentences.push('No likely change of the newest figures would clear it: it needs new testing days.');
  const date = dateSentence(input, details);
  if (date) sentences.push(date);
  sentences.push('It must hold at two testing days running before the coaches may clear it.');
  return sentences;
}

function changeSentence(input: OutrunInput, change: Change, details: ClearsWhenDetails): string {
  const parts: string[] = [];
  const changed = changedInput(input, change);
  if (change.lead) {
    const each = (details.newestLead ?? []).map(({ test, mean: now, unit, decimals }) => {
      const target = roundedUp(now * (1 + change.lead! / 1000), decimals);
      return `${test} about ${figure(target, decimals)}${unit}, now ${figure(now, decimals)}${unit}`;
    });
    const named = each.length > 0 ? ` (${each.join('; ')})` : '';
    parts.push(
      `the lead leg at least ${figure(change.lead / 10)} % up in the capacity tests, with the trail leg as now${named}`,
    );
  }
  if (change.carry) {
    const carryOf = ({ divergence, asOf }: OutrunInput) =>
      mean(
        pairsInOrder(divergence!.pairs, divergence!.asOf ?? asOf)
          .slice(-2)
          .map(({ carry }) => carry),
      );
    parts.push(
      `the newest two carries at least ${figure(change.carry / 10)} % shorter for the same growth and strength ` +
        `(about ${figure(carryOf(changed))} m, now ${figure(carryOf(input))} m)`,
    );
  }
  if (change.swing) {
    const target = Math.floor(changed.demand!.peakLead.mean * 100) / 100;
    const now = figure(input.demand!.peakLead.mean, 2);
    parts.push(`the peak lead force in the driver swing at most ${figure(target, 2)} × body weight (now ${now})`);
  }
  if (change.return) {
    const backOf = ({ lateReturn }: OutrunInput) => mean(lateReturn!.impact) - mean(lateReturn!.earlyDownswing);
    parts.push(
      `the pressure at impact no more than ${figure(-backOf(changed))} points of lead share behind early downswing ` +
        `(now ${figure(-backOf(input))})`,
    );
  }
  const text = parts.join(', and ');
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;
}

function dateSentence(input: OutrunInput, details: ClearsWhenDetails): string | null {
  const asOf = details.asOf ?? dateOfInput(input);
  if (asOf === null) return null;
  const known = impossibleBefore(input, asOf, details);
  if (!known?.date) return null;
  const { testingDays, date } = known;
  const until = testingDays === 1 ? 'the next testing day has' : `${WORDS[testingDays]} more testing days have`;
  return `Data already taken keep their points until ${until} replaced them: not before ${plainDate(date)}.`;
}

const WORDS = ['no', 'one', 'two', 'three', 'four'];

/** The judgement's date where the input knows it as a date: its own, else that of the newest pair. */
function dateOfInput({ asOf, divergence }: OutrunInput): string | null {
  const own = divergence?.asOf ?? asOf ?? pairsInOrder(divergence?.pairs ?? []).at(-1)?.day;
  return typeof own === 'string' ? own : null;
}

function roundedUp(value: number, decimals: number): number {
  const step = 10 ** decimals;
  return Math.ceil(value * step - 1e-9) / step;
}
