/** Whether a curve may be used, and what was found on it; with `ok` true the problems are remarks only. */
export interface CurveQuality {
  ok: boolean;
  problems: string[];
}

/** Findings on a curve: `rejecting` ones make a figure wrong, `remarks` do not. */
export interface CurveFindings {
  rejecting: string[];
  remarks: string[];
}

/**
 * The verdict on a curve from its findings, the rejecting ones first.
 *
 * @param findings rejecting findings and remarks
 */
export function curveQuality({ rejecting, remarks }: CurveFindings): CurveQuality {
  return { ok: rejecting.length === 0, problems: [...rejecting, ...remarks] };
}
