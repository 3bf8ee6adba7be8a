const VOID =
  /\b(void(ed)?|invalid|not valid|no[ -]?rep|no[ -]?count|not count(ed)?|(didn'?t|did not|doesn'?t|does not) count|foul(ed)?|fault(y)?|fail(ed)?|discard(ed)?|disregard(ed)?|ignored?|scrap(ped)?|reject(ed)?|cancel(led|ed)?|abort(ed)?|mistrial|slip(s|ped)?|trip(ped)?|fell|stumbl(e|ed)|lost (his |her |their )?balance|overbalanced|stepped (out|off|over|down)|touched down|foot down|false start|do not use|don'?t use|not to be used)\b/i;
const DENIED = /\b(not|never|no longer)\s+(a\s+)?(void|slip|foul|fault)|\b(no|without)\s+(slips?|fouls?|faults?)\b/i;
const NO = /^(no?|false|0|invalid|void|bad)$/i;
const YES = /^(y(es)?|true|1|x|✓|✗|void(ed)?|invalid)$/i;

/**
 * Why a trial does not count, from what stands beside it; null where nothing says so.
 *
 * @param remark  the remark's words
 * @param heading the words of the remark's column: under `Valid`, `no` makes void; under `Void`, `yes` does
 * @example voidReasonOf('foot slipped, void', 'remark') // → 'foot slipped, void'
 */
export function voidReasonOf(remark: string, heading = ''): string | null {
  const text = remark.trim();
  if (text === '') return null;
  if (/^(valid|ok|counts?|counted|good|accepted)$/.test(heading))
    return NO.test(text) ? 'marked as not valid' : wordsSayVoid(text);
  if (/^(void(ed)?|invalid|foul|discard(ed)?|excluded?)$/.test(heading))
    return YES.test(text) ? 'marked void' : wordsSayVoid(text);
  return wordsSayVoid(text);
}

const wordsSayVoid = (text: string): string | null => (VOID.test(text) && !DENIED.test(text) ? text : null);
