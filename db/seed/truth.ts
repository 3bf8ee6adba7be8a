/**
 * The invented athletes of Saltmarsh Links Junior Academy and what is true of each: the generator adds growth, noise
 * and missed days. Nothing here is a real child.
 */
export interface Truth {
  givenName: string;
  familyName: string;
  sex: 'female' | 'male';
  birthDate: string;
  squad: 'Curlew' | 'Dunlin';
  plays: 'left' | 'right';
  /** First recorded wrongly as the other hand, corrected after the fifth term. */
  handednessCorrected?: true;
  /** Stature against the median of age and sex, in standard deviations, and months ahead of (or behind) the calendar. */
  statureZ: number;
  tempoMonths: number;
  /** Push of one leg in the first term, N per kg, and its change a term. */
  pushPerKg: number;
  pushPerKgATerm: number;
  /** True lead minus trail, % of the larger, term by term (the last value stays). */
  leadPct: readonly number[];
  /** Carry beyond what growth and strength bring, % a term from the second on (the last value stays). */
  extraCarryPct: readonly number[];
  carryM: number;
  /** Peak lead force in the driver swing over the lead leg's push. */
  demand: number;
  style: 'front-foot' | 'reverse';
  /** Attack angle of the driver, degrees, by term (the last value stays). */
  attackDeg: readonly number[];
  missesTerms?: readonly number[];
}

const usual = {
  statureZ: 0,
  tempoMonths: 0,
  pushPerKg: 17.6,
  pushPerKgATerm: 0.18,
  leadPct: [1],
  extraCarryPct: [0],
  demand: 0.72,
  style: 'front-foot',
  attackDeg: [1],
} as const;

type Named = Pick<Truth, 'givenName' | 'familyName' | 'sex' | 'birthDate' | 'carryM'> & Partial<Truth>;

const curlew = (athlete: Named): Truth => ({ ...usual, squad: 'Curlew', plays: 'right', ...athlete });
const dunlin = (athlete: Named): Truth => ({ ...usual, squad: 'Dunlin', plays: 'right', pushPerKg: 16.4, ...athlete });

/** A driver that outruns its lead side: carry climbs while the lead leg stands still. */
const outrun = {
  pushPerKgATerm: -0.02,
  extraCarryPct: [0, 4.5, 5, 5, 4.5, 4, 3],
  demand: 1.08,
  style: 'reverse',
  attackDeg: [0.5, 1, 2, 3, 3.5, 4, 4],
} as const;

export const TRUTHS: readonly Truth[] = [
  curlew({
    ...{ givenName: 'Linnea', familyName: 'Okonjo', sex: 'female', birthDate: '2013-06-18', carryM: 128 },
    ...{ ...outrun, statureZ: 0.3, leadPct: [-6, -7, -8, -9, -11, -12, -12] },
  }),
  curlew({
    ...{ givenName: 'Noor', familyName: 'Haddad', sex: 'female', birthDate: '2012-12-30', carryM: 131 },
    ...{ plays: 'left', leadPct: [-9, -10, -11], statureZ: 0.6, tempoMonths: -8 },
  }),
  curlew({
    ...{ givenName: 'Tomasz', familyName: 'Brandt', sex: 'male', birthDate: '2011-02-03', carryM: 158 },
    ...{ ...outrun, leadPct: [-5, -7, -8, -10, -11, -10, -10], demand: 1.04 },
  }),
  curlew({
    givenName: 'Saoirse',
    familyName: 'Lindahl',
    sex: 'female',
    birthDate: '2013-09-27',
    carryM: 121,
    missesTerms: [5],
  }),
  curlew({
    givenName: 'Bram',
    familyName: 'Castellanos',
    sex: 'male',
    birthDate: '2011-12-20',
    carryM: 162,
    leadPct: [2],
  }),
  curlew({
    givenName: 'Ikaika',
    familyName: 'Mahoe',
    sex: 'male',
    birthDate: '2011-09-09',
    carryM: 171,
    leadPct: [4],
    statureZ: 0.9,
  }),
  curlew({
    givenName: 'Priya',
    familyName: 'Raghunathan',
    sex: 'female',
    birthDate: '2011-05-14',
    carryM: 140,
    style: 'reverse',
  }),
  curlew({
    ...{ givenName: 'Emeka', familyName: 'Achterberg', sex: 'male', birthDate: '2012-03-22', carryM: 138 },
    ...{ ...outrun, leadPct: [-6, -8, -9, -11, -12, -13, -13], demand: 1.12 },
  }),
  curlew({
    givenName: 'Yuki',
    familyName: 'Fontaine',
    sex: 'female',
    birthDate: '2010-07-11',
    carryM: 149,
    leadPct: [-2],
  }),
  curlew({
    ...{ givenName: 'Mateus', familyName: 'Kowalczyk', sex: 'male', birthDate: '2012-10-02', carryM: 145 },
    ...{ tempoMonths: -14, pushPerKgATerm: 0, leadPct: [-1] },
  }),
  curlew({
    ...{ givenName: 'Aroha', familyName: 'Tamatea', sex: 'female', birthDate: '2011-11-05', carryM: 143 },
    // Found early, trained, and level again: the one that was cleared.
    ...{
      leadPct: [-11, -12, -12, -9, -3, 1, 2],
      extraCarryPct: [0, 7, 7, 3, 0, -3, -4],
      demand: 0.78,
    },
  }),
  curlew({
    ...{ givenName: 'Leonid', familyName: 'Vassiliou', sex: 'male', birthDate: '2010-04-27', carryM: 190 },
    ...{ extraCarryPct: [0, 3, 4, 2, 1, 0, 0], leadPct: [0] },
  }),
  dunlin({
    givenName: 'Teodor',
    familyName: 'Okonjo',
    sex: 'male',
    birthDate: '2015-08-24',
    carryM: 108,
    leadPct: [-1],
  }),
  dunlin({
    givenName: 'Zainab',
    familyName: 'Sørensen',
    sex: 'female',
    birthDate: '2014-01-15',
    carryM: 112,
    tempoMonths: 10,
  }),
  dunlin({
    ...{ givenName: 'Caspian', familyName: 'Mbatha', sex: 'male', birthDate: '2014-03-08', carryM: 122 },
    // An outrun by the skin of its teeth: the carry is ahead, the swing asks no more than the others'.
    ...{ pushPerKgATerm: -0.02, leadPct: [-7, -8, -9, -10, -11, -11, -11], demand: 0.97 },
    ...{ extraCarryPct: [0, 1, 2, 2, 1.5, 1.5, 1], style: 'front-foot' as const },
  }),
  dunlin({
    ...{ givenName: 'Inés', familyName: 'Takahashi', sex: 'female', birthDate: '2015-02-19', carryM: 101 },
    ...{ plays: 'left', handednessCorrected: true, leadPct: [3] },
  }),
  dunlin({ givenName: 'Rafe', familyName: 'Dubois', sex: 'male', birthDate: '2014-11-30', carryM: 115, leadPct: [2] }),
  dunlin({
    givenName: 'Wren',
    familyName: 'Abernathy',
    sex: 'female',
    birthDate: '2014-06-06',
    carryM: 109,
    missesTerms: [3],
  }),
  dunlin({
    givenName: 'Kofi',
    familyName: 'Lindgren',
    sex: 'male',
    birthDate: '2015-05-17',
    carryM: 106,
    style: 'reverse',
  }),
  dunlin({
    givenName: 'Mei',
    familyName: 'Alvarado',
    sex: 'female',
    birthDate: '2014-09-13',
    carryM: 108,
    leadPct: [-3],
  }),
  dunlin({
    ...{ givenName: 'Jonas', familyName: 'Petrosyan', sex: 'male', birthDate: '2014-02-26', carryM: 124 },
    ...{ ...outrun, leadPct: [-6, -8, -9, -10, -10, -10, -10], demand: 1.02 },
  }),
  dunlin({
    givenName: 'Anouk',
    familyName: 'Desta',
    sex: 'female',
    birthDate: '2014-04-21',
    carryM: 113,
    leadPct: [1],
  }),
  dunlin({
    givenName: 'Tariq',
    familyName: 'Novotny',
    sex: 'male',
    birthDate: '2015-10-10',
    carryM: 104,
    missesTerms: [0],
  }),
  dunlin({ givenName: 'Freja', familyName: 'Iqbal', sex: 'female', birthDate: '2016-01-29', carryM: 92, leadPct: [0] }),
];

/** Term, testing day, driver session, and that day's weather, oldest first. */
export const TERMS = [
  {
    name: 'Autumn 24',
    startsOn: '2024-09-02',
    endsOn: '2024-12-13',
    testedOn: '2024-11-16',
    droveOn: '2024-11-20',
    temperatureC: 9,
    pressurePa: 101_600,
    windMps: 0.6,
    place: 'Range',
  },
  {
    name: 'Spring 25',
    startsOn: '2025-01-06',
    endsOn: '2025-04-11',
    testedOn: '2025-03-08',
    droveOn: '2025-03-12',
    temperatureC: 11,
    pressurePa: 101_100,
    windMps: -0.8,
    place: 'Range',
  },
  {
    name: 'Summer 25',
    startsOn: '2025-04-28',
    endsOn: '2025-07-25',
    testedOn: '2025-07-05',
    droveOn: '2025-07-09',
    temperatureC: 20,
    pressurePa: 101_800,
    windMps: 1.1,
    place: 'Range',
  },
  {
    name: 'Autumn 25',
    startsOn: '2025-09-01',
    endsOn: '2025-12-12',
    testedOn: '2025-11-15',
    droveOn: '2025-11-19',
    temperatureC: 8,
    pressurePa: 100_900,
    windMps: 0,
    place: 'Covered bays',
  },
  {
    name: 'Spring 26',
    startsOn: '2026-01-05',
    endsOn: '2026-04-10',
    testedOn: '2026-03-07',
    droveOn: '2026-03-11',
    temperatureC: 10,
    pressurePa: 102_000,
    windMps: 0.4,
    place: 'Range',
  },
  {
    name: 'Summer 26',
    startsOn: '2026-04-27',
    endsOn: '2026-07-24',
    testedOn: '2026-07-04',
    droveOn: '2026-07-08',
    temperatureC: 22,
    pressurePa: 101_500,
    windMps: -0.5,
    place: 'Range',
  },
  {
    name: 'Autumn 26',
    startsOn: '2026-08-31',
    endsOn: '2026-12-11',
    testedOn: '2026-11-14',
    droveOn: '2026-11-18',
    temperatureC: 10,
    pressurePa: 101_300,
    windMps: 0.2,
    place: 'Range',
  },
] as const;

/** The value of a list in this term; the last one stays. */
export const inTerm = (values: readonly number[], term: number): number => values[Math.min(term, values.length - 1)]!;
