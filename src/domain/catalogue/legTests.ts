import type { CatalogueTest } from '#src/domain/catalogue/catalogueTest.ts';

const LEG = { sided: true, better: 'higher', comparesIn: 'percent', attempts: 3, uses: 'mean' } as const;

/**
 * Push, jump and hop, which decisions are made from, and the reaches. Within-day variation as SCIENCE §9 takes it;
 * the first medians are our proposal, spread so that ordinary children of either sex lie within ⅔ to 1½ of them.
 */
export const LEG_TESTS: readonly CatalogueTest[] = Object.freeze<CatalogueTest[]>([
  {
    ...LEG,
    key: 'push',
    name: 'Single-leg isometric push',
    quantity: 'force',
    unit: 'N',
    restS: 60,
    lowestSi: 50,
    highestSi: 4000,
    cvPct: 4,
    noiseSource: 'Our value 4 %, between the 3.4 to 8.2 % of youth peak force (JSSM 25:556) [P]',
    protocol:
      'One foot on the plate, knee and hip at the same angle every time, trunk braced. A quiet second, then push as hard and as fast as possible for three to five seconds. Three trials a leg, legs in turn. The peak counts, body weight included.',
    capacity: 'push',
    firstMediansSi: [600, 730, 880, 1030],
  },
  {
    ...LEG,
    key: 'jump',
    name: 'Single-leg countermovement jump',
    quantity: 'length',
    unit: 'cm',
    restS: 30,
    lowestSi: 0.02,
    highestSi: 0.7,
    cvPct: 5,
    noiseSource: 'Our value 5 %, from 2.7 to 5.7 % between days in girls of about ten (McCubbine et al.) [P]',
    protocol:
      'Hands on hips, stand still for a second on one leg, dip and jump straight up, land on the same leg and hold it. Three trials a leg, legs in turn.',
    capacity: 'jump',
    firstMediansSi: [0.14, 0.15, 0.15, 0.155],
  },
  {
    ...LEG,
    key: 'hop',
    name: 'Single-leg hop',
    quantity: 'length',
    unit: 'cm',
    restS: 45,
    lowestSi: 0.15,
    highestSi: 3.5,
    cvPct: 4.5,
    noiseSource: 'Our value 4.5 %, from 2.6 to 6.0 % within a day in girls of about ten (McCubbine et al.) [P]',
    protocol:
      'Toe on the line, one hop forwards as far as possible, land on the same leg and stick it for two seconds. Toe to heel, to the centimetre. One to three tries for practice, three trials a leg, legs in turn.',
    capacity: 'hop',
    firstMediansSi: [1.38, 1.42, 1.45, 1.5],
  },
  {
    ...LEG,
    key: 'triple-hop',
    name: 'Single-leg triple hop',
    quantity: 'length',
    unit: 'cm',
    restS: 60,
    lowestSi: 0.6,
    highestSi: 11,
    cvPct: 5,
    noiseSource: 'Our value 5 %, from within-day CV up to 10.67 % (Davey 2021, Symmetry 13:1890) [P]',
    protocol:
      'Three hops in a row on one leg without a stop, the last one held for two seconds. Toe of the start to heel of the last landing. Three trials a leg, legs in turn.',
    capacity: null,
    firstMediansSi: [3.8, 4.1, 4.5, 4.9],
  },
  ...(['anterior', 'posteromedial', 'posterolateral'] as const).map((direction): CatalogueTest => {
    const medians = { anterior: 0.62, posteromedial: 0.86, posterolateral: 0.84 }[direction];
    return {
      ...LEG,
      key: `${direction}-reach`,
      name: `${direction[0]!.toUpperCase()}${direction.slice(1)} reach`,
      quantity: 'length',
      unit: 'cm',
      restS: 20,
      lowestSi: 0.15,
      highestSi: 1.6,
      cvPct: 3,
      noiseSource: 'Our value 3 %; no youth figure found [P]',
      protocol: `Stand on one leg, reach with the other foot along the ${direction} line as far as the stance stays still, and come back. The side is that of the standing leg. Six tries for practice, three trials a leg.`,
      capacity: null,
      firstMediansSi: [medians, medians * 1.065, medians * 1.1, medians * 1.13],
    };
  }),
]);
