import type { CatalogueTest } from '#src/domain/catalogue/catalogueTest.ts';

/** A test of the catalogue as an academy keeps it. */
export function testRow(test: CatalogueTest) {
  return {
    key: test.key,
    name: test.name,
    quantity: test.quantity,
    unit: test.unit,
    sided: test.sided,
    better: test.better,
    compares_in: test.comparesIn,
    attempts: test.attempts,
    uses: test.uses,
    rest_s: test.restS,
    lowest_si: test.lowestSi,
    highest_si: test.highestSi,
    cv_pct: test.cvPct,
    noise_source: test.noiseSource,
    protocol: test.protocol,
    capacity: test.capacity,
    first_medians_si: [...test.firstMediansSi],
  };
}
