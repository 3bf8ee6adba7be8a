/** The facts at the head of a Record, ready to be said. */
export interface RecordHead {
  name: string;
  squad: string | null;
  /** Years, with one decimal: `13.4`. */
  age: string;
  plays: 'left' | 'right' | null;
  /** Growth velocity with its half-width, cm a year: `7.4 ± 1.2`. */
  growth: string | null;
}

export interface RecordSection {
  key: string;
  label: string;
  href: string;
}

/** The sections of a Record as staff have them. */
export const recordSections = (athleteId: string): RecordSection[] => [
  { key: 'season', label: 'Season line', href: `/athletes/${athleteId}` },
  { key: 'strength', label: 'Strength', href: `/athletes/${athleteId}/strength` },
  { key: 'driver', label: 'Driver', href: `/athletes/${athleteId}/driver` },
  { key: 'ground', label: 'Ground', href: `/athletes/${athleteId}/ground` },
  { key: 'growth', label: 'Growth', href: `/athletes/${athleteId}/growth` },
];
