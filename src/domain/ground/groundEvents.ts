/** Moments of the swing in their usual order; `earlyDownswing` (shaft vertical) and `leadArmParallel` may swap. */
export const GROUND_EVENTS = [
  'takeaway',
  'lateBackswing',
  'top',
  'earlyDownswing',
  'leadArmParallel',
  'midDownswing',
  'impact',
  'finish',
] as const;

/** The name of a moment of the swing. */
export type GroundEvent = (typeof GROUND_EVENTS)[number];

/** Times of the moments in seconds from the first sample. */
export type GroundEventTimes = Record<'takeaway' | 'top' | 'leadArmParallel' | 'impact', number> &
  Partial<Record<'lateBackswing' | 'earlyDownswing' | 'midDownswing' | 'finish', number>>;
