/**
 * The sentence at the foot of every page, and of every answer about Care. Fixed text.
 *
 * Source: our own wording, resting on the refer rules that are standard practice in sports medicine.
 */
export const CARE_FOOTER =
  "Information for coaches, not a medical assessment. Pain, swelling, night pain or numbness: stop and see a doctor or physiotherapist. A flag doesn't mean an injury is likely; no flag doesn't mean safe.";
