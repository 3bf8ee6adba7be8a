/** How a Season line is laid out for a width. Lengths are in units of its own viewBox, about one CSS pixel each. */
export interface SeasonSize {
  name: 'narrow' | 'middle' | 'wide';
  width: number;
  left: number;
  right: number;
  /** Lane names stand above the lane where there is no room beside it. */
  namesAbove: boolean;
  font: { name: number; small: number };
  lane: { carry: number; strength: number; growth: number; event: number };
  gap: number;
  ticks: number;
}

export const SEASON_SIZES: readonly SeasonSize[] = [
  {
    name: 'narrow',
    width: 340,
    left: 32,
    right: 46,
    namesAbove: true,
    font: { name: 14, small: 12.5 },
    lane: { carry: 96, strength: 112, growth: 60, event: 24 },
    gap: 14,
    ticks: 3,
  },
  {
    name: 'middle',
    width: 720,
    left: 136,
    right: 86,
    namesAbove: false,
    font: { name: 15, small: 13.5 },
    lane: { carry: 120, strength: 134, growth: 70, event: 28 },
    gap: 30,
    ticks: 4,
  },
  {
    name: 'wide',
    width: 1180,
    left: 136,
    right: 112,
    namesAbove: false,
    font: { name: 15, small: 13 },
    lane: { carry: 130, strength: 140, growth: 74, event: 30 },
    gap: 32,
    ticks: 4,
  },
];
