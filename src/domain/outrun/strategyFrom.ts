import type { AthleteHistory, Built } from '#src/domain/outrun/athleteHistory.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import { driverSwings } from '#src/domain/outrun/groundFrom.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { median } from '#src/domain/statistics/median.ts';

/** Slowest trace that can time a peak to the 20 ms of late-peak. */
export const LATE_PEAK_MIN_HZ = 200;

/** late-return's block from the newest driver ground session with five swings that have both shares. */
export function lateReturnFrom(history: AthleteHistory): Built<NonNullable<OutrunInput['lateReturn']>> {
  const swings = driverSwings(history, ({ earlyDownswingPct, impactPct }) =>
    earlyDownswingPct === null || impactPct === null ? null : { early: earlyDownswingPct, impact: impactPct },
  );
  if (swings.session === null) return { block: undefined, reason: swings.reason, used: [] };
  const values = [...swings.values].sort((a, b) => a.early - b.early || a.impact - b.impact);
  const block = { earlyDownswing: values.map(({ early }) => early), impact: values.map(({ impact }) => impact) };
  const value = `${figure(mean(block.earlyDownswing))} % and ${figure(mean(block.impact))} %`;
  const what = `lead share at early downswing and at impact, ${values.length} driver swings`;
  return { block, reason: null, used: [{ what, on: swings.session.on, value }] };
}

/** late-peak's block from the newest driver ground session with five swings on force plates at 200 Hz or more. */
export function latePeakFrom(history: AthleteHistory): Built<NonNullable<OutrunInput['latePeak']>> {
  const swings = driverSwings(history, ({ afterLeadArmParallelMs, sampleRateHz, measure }) =>
    measure === 'force' && sampleRateHz >= LATE_PEAK_MIN_HZ ? afterLeadArmParallelMs : null,
  );
  if (swings.session === null) return { block: undefined, reason: swings.reason, used: [] };
  const afterLeadArmParallelMs = [...swings.values].sort((a, b) => a - b);
  const value = `${figure(median(afterLeadArmParallelMs), 0)} ms (median)`;
  const what = `lead peak after lead arm parallel, ${afterLeadArmParallelMs.length} driver swings`;
  return { block: { afterLeadArmParallelMs }, reason: null, used: [{ what, on: swings.session.on, value }] };
}
