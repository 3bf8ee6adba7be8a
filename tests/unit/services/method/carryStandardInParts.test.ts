import { expect, it } from 'vitest';
import { carryStandard } from '#src/domain/driver/carryStandard.ts';
import { carryStandardInParts } from '#src/services/method/carryStandardInParts.ts';

const shots = Array.from({ length: 23 }, (_, i) => ({
  ballSpeed: 50 + (i % 7),
  launchDeg: 10 + (i % 5),
  spinRpm: i === 11 ? null : 2500 + 20 * i,
  carry: 150 + i,
}));
const conditions = { temperatureC: 4, altitudeM: 300, wind: -1 };

it('gives in parts what one call gives', async () => {
  expect(await carryStandardInParts({ shots, conditions })).toEqual(carryStandard({ shots, conditions }));
});

it('lets others have their turn between the parts', async () => {
  let turns = 0;
  const ticking = setInterval(() => (turns += 1), 0);
  await carryStandardInParts({ shots: Array.from({ length: 20 }, () => shots).flat(), conditions });
  clearInterval(ticking);
  expect(turns).toBeGreaterThan(0);
});
