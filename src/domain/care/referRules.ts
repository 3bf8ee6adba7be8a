/** Stands beside the rules wherever they are shown. */
export const REFER_RULES_NOTE =
  'Standard practice in sports medicine, written from memory and still to be verified by a person trained in it. It helps to decide whom to ask; it does not diagnose.';

/** When to see a doctor or physiotherapist. `urgent`: the same day. */
export interface ReferRule {
  sentence: string;
  urgent: boolean;
}

/** The list of signs that go to a clinician, in our own words. Source: standard practice, from memory. */
export const REFER_RULES: readonly ReferRule[] = Object.freeze([
  { sentence: 'Numbness or weakness, or a change of bladder or bowel habit, with back pain.', urgent: true },
  {
    sentence:
      'Hip, groin or knee pain between 9 and 16 years when the hip turns less than it should: have the hip looked at first.',
    urgent: true,
  },
  { sentence: 'Pain after a fall or a blow.', urgent: false },
  { sentence: 'A limp.', urgent: false },
  { sentence: 'Pain at night or at rest, fever, or loss of weight.', urgent: false },
  { sentence: 'Back pain that lasts longer than two to three weeks.', urgent: false },
  { sentence: 'Back pain that gets worse with arching, with turning, or with arching on one leg.', urgent: false },
  { sentence: 'Wrist pain with swelling or a weak grip.', urgent: false },
  {
    sentence:
      'Tenderness on a bone at the heel, the knee, or the edge of the pelvis while growing fast: fewer jumps and drivers until seen.',
    urgent: false,
  },
  { sentence: 'Pain that changes the swing.', urgent: false },
]);
