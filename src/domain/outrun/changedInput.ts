import { pairsInOrder } from '#src/domain/outrun/divergenceRaw.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';

/** What can change: the lead leg, the carry, the swing's force on the lead leg, the way back at impact. */
export const LEVERS = ['lead', 'carry', 'swing', 'return'] as const;

/** The name of something that can change. */
export type Lever = (typeof LEVERS)[number];

/** A change of each lever in tenths of a per cent; a lever left out does not change. */
export type Change = Readonly<Partial<Record<Lever, number>>>;

/** The largest change that is searched, tenths of a per cent: a lead leg doubled, a carry or swing halved. */
export const LARGEST_CHANGE: Readonly<Record<Lever, number>> = Object.freeze({
  lead: 1000,
  carry: 500,
  swing: 500,
  return: 1000,
});

/**
 * The same input as if the newest data had been otherwise: the lead leg stronger by a common per cent in every
 * capacity test (and so in the newest two pairs and in the capacity of the demand), the newest two carries shorter,
 * the swing's peak lower, the way back from early downswing to impact shorter.
 */
export function changedInput(input: OutrunInput, change: Change): OutrunInput {
  const up = 1 + (change.lead ?? 0) / 1000;
  const carry = 1 - (change.carry ?? 0) / 1000;
  const swing = 1 - (change.swing ?? 0) / 1000;
  const back = 1 - (change.return ?? 0) / 1000;
  const { leadDeficit, divergence, demand, lateReturn } = input;
  const pairs = divergence && pairsInOrder(divergence.pairs, divergence.asOf ?? input.asOf);
  return {
    ...input,
    leadDeficit: leadDeficit && { values: leadDeficit.values.map((value) => ({ ...value, lead: value.lead * up })) },
    divergence: divergence &&
      pairs && {
        ...divergence,
        pairs: pairs.map((pair, i) =>
          i < pairs.length - 2 ? pair : { ...pair, carry: pair.carry * carry, strength: pair.strength * up },
        ),
      },
    demand: demand && {
      ...demand,
      peakLead: { ...demand.peakLead, mean: demand.peakLead.mean * swing },
      capacity: { ...demand.capacity, mean: demand.capacity.mean * up },
    },
    lateReturn: lateReturn && {
      ...lateReturn,
      impact: lateReturn.impact.map((share, i) => {
        const early = lateReturn.earlyDownswing[i]!;
        return early + (share - early) * back;
      }),
    },
  };
}
