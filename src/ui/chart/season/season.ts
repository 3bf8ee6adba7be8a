/** A dated value with its 90 % interval. */
export interface SeasonPoint {
  /** YYYY-MM-DD */
  on: string;
  value: number;
  interval: readonly [number, number] | null;
}

export interface SeasonTerm {
  name: string;
  /** YYYY-MM-DD */
  startsOn: string;
  /** YYYY-MM-DD */
  endsOn: string;
}

export interface SeasonOutrun {
  /** Oldest first; `null` where it was cleared or set aside. */
  steps: readonly { on: string; level: 'look' | 'act' | null; word?: string }[];
}

/** What the Season line shows. Every list is in date order. */
export interface Season {
  terms: readonly SeasonTerm[];
  /** Standard-conditions carry, m. */
  carry: readonly SeasonPoint[];
  /** One strength test, lead and trail in the same unit. */
  strength: {
    name: string;
    unit: string;
    digits: number;
    lead: readonly SeasonPoint[];
    trail: readonly SeasonPoint[];
  } | null;
  /** Growth velocity, cm a year. */
  growth: readonly SeasonPoint[];
  /** Staff's lane alone: left out, there is no such lane, no column and no word of it. */
  outruns?: readonly SeasonOutrun[];
}
