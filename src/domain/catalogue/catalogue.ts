import type { CatalogueTest } from '#src/domain/catalogue/catalogueTest.ts';
import { FIELD_TESTS } from '#src/domain/catalogue/fieldTests.ts';
import { LEG_TESTS } from '#src/domain/catalogue/legTests.ts';

/**
 * Every test that a new academy starts with, in the order of a testing day: the leg tests that decisions are made
 * from, then the field tests beside them.
 */
export const CATALOGUE: readonly CatalogueTest[] = Object.freeze([...LEG_TESTS, ...FIELD_TESTS]);
