import { describe, expect, it } from 'vitest';
import { seasonSentence, type SeasonFacts } from '#src/domain/record/seasonSentence.ts';

const measured = (value: number, half: number) => ({ value, half });
const facts: SeasonFacts = {
  carry: { first: measured(163, 3), last: measured(185, 4), since: 'Autumn 24' },
  leadPush: { first: measured(17, 0.9), last: measured(16.8, 0.9) },
  differences: [measured(-11, 4), measured(-8, 6), measured(-3, 4.5)],
  sameSideTwice: true,
};

describe('seasonSentence', () => {
  it('tells a change beyond its noise with its interval', () => {
    // by hand: 22 ± √(3² + 4²) = 5; weights 1/4², 1/6², 1/4.5² of −11, −8, −3 → −7.66 ± 2.68
    expect(seasonSentence(facts)).toBe(
      'Carry has grown 22 ± 5 m since Autumn 24; the lead leg’s push per kilogram has stayed level within its noise. ' +
        'Over the newest tests the lead leg is 8 ± 3 % weaker than the trail, the same side twice.',
    );
  });

  it('calls nothing a change inside its noise', () => {
    const still = seasonSentence({
      ...facts,
      carry: { first: measured(163, 3), last: measured(168, 4), since: 'Autumn 24' },
    });
    expect(still).toContain('Carry has not changed beyond its noise since Autumn 24');
    const level = seasonSentence({ ...facts, differences: [measured(-3, 4), measured(2, 4)] });
    expect(level).toContain('no difference between the legs stands beyond its noise');
  });

  it('says a lead side that is stronger, and never counts it as the same side twice', () => {
    const stronger = seasonSentence({ ...facts, differences: [measured(9, 4)] });
    expect(stronger).toContain('9 ± 4 % stronger than the trail.');
  });

  it('says what is missing', () => {
    expect(seasonSentence({ carry: null, leadPush: null, differences: [], sameSideTwice: false })).toBe(
      'There is no driver session yet. The legs have not been compared yet.',
    );
  });
});
