import { exampleSwing } from '#src/services/method/content/exampleCurves.ts';
import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const G1 = 'after the group of Ball and Best 2007, made up (check G1)';
const EVENTS = 'Moments of the swing, from the first sample';

export const groundTracePage: MethodPage = {
  title: 'Ground trace',
  group: 'Driver',
  sentence: 'What the two feet do through one swing: the lead share, the style, the lead side’s peak and its timing.',
  purpose: [
    'Force or pressure under each foot, sampled through one swing, with the times of its moments. The lead share says where the pressure was; from early downswing to impact it either goes on forward or moves back, and both are ways of good players.',
    'The peak of the lead side is compared with body weight and with the moment at which the lead arm is parallel to the ground in the downswing.',
  ],
  formulas: [
    { says: 'Lead share at a moment', tex: raw`s = 100\,\frac{F_{\text{lead}}}{F_{\text{lead}} + F_{\text{trail}}}` },
    {
      says: 'Style: its change from early downswing to impact, undetermined within ± 5 points',
      tex: raw`\Delta = s_{\text{impact}} - s_{\text{early downswing}}`,
    },
    {
      says: 'How fast the force rises to the peak, from 0.1 s before lead arm parallel',
      tex: raw`\text{ramp} = \frac{F_{\text{peak}} - F(t_{\text{LAP}} - 0.1)}{W\,(t_{\text{peak}} - t_{\text{LAP}} + 0.1)}`,
    },
  ],
  sources: [
    {
      of: 'Two styles and the moments',
      source: 'Ball and Best 2007, Journal of Sports Sciences 25:757–70 (62 golfers)',
      tag: 'read',
    },
    {
      of: 'Lead arm parallel as the critical moment',
      source: 'Han and others 2019, Sports Biomechanics 18:115–34 (63 men of handicap 3 or better)',
      tag: 'read',
    },
    {
      of: 'Peak at or before lead arm parallel; about 1.5 × body weight in about 0.1 s',
      source: 'Said by coaches',
      tag: 'practice',
    },
    { of: 'Within ± 5 points no style is named', source: 'Marram', tag: 'proposal' },
  ],
  limits: [
    'Pressure is not mass. A share says where the pressure was, never where the body went.',
    'Neither style is an error: both are found from professionals to beginners.',
    'No junior figures in body weights were found; 1.5 is a saying, not a norm.',
    'Driver and irons are kept apart: their traces differ.',
    'A mat that measures pressure only gives shares and times, no force.',
  ],
  fields: [
    { path: 'sampleRate', label: 'Samples a second', kind: 'number', unit: 'Hz' },
    { path: 'lead', label: 'Lead foot', kind: 'samples', hint: 'Newton, or any unit of pressure' },
    { path: 'trail', label: 'Trail foot', kind: 'samples', hint: 'The same unit' },
    { path: 'mass', label: 'Mass', kind: 'number', unit: 'kg', optional: true, hint: 'Where the samples are newton' },
    { path: 'events.takeaway', label: 'Takeaway', kind: 'number', unit: 's', section: EVENTS },
    {
      path: 'events.lateBackswing',
      label: 'Late backswing',
      kind: 'number',
      unit: 's',
      optional: true,
      section: EVENTS,
    },
    { path: 'events.top', label: 'Top', kind: 'number', unit: 's', section: EVENTS },
    {
      path: 'events.earlyDownswing',
      label: 'Early downswing (shaft vertical)',
      kind: 'number',
      unit: 's',
      optional: true,
      section: EVENTS,
    },
    { path: 'events.leadArmParallel', label: 'Lead arm parallel', kind: 'number', unit: 's', section: EVENTS },
    {
      path: 'events.midDownswing',
      label: 'Mid downswing (shaft level)',
      kind: 'number',
      unit: 's',
      optional: true,
      section: EVENTS,
    },
    { path: 'events.impact', label: 'Impact', kind: 'number', unit: 's', section: EVENTS },
    { path: 'events.finish', label: 'Finish', kind: 'number', unit: 's', optional: true, section: EVENTS },
  ],
  outputs: {
    'leadSharePctAt.takeaway': 'Lead share at takeaway, %',
    'leadSharePctAt.lateBackswing': 'Lead share in late backswing, %',
    'leadSharePctAt.top': 'Lead share at the top, %',
    'leadSharePctAt.earlyDownswing': 'Lead share in early downswing, %',
    'leadSharePctAt.leadArmParallel': 'Lead share at lead arm parallel, %',
    'leadSharePctAt.midDownswing': 'Lead share in mid downswing, %',
    'leadSharePctAt.impact': 'Lead share at impact, %',
    'leadSharePctAt.finish': 'Lead share at the finish, %',
    style: 'Style',
    styleChangePct: 'Change from early downswing to impact, points',
    'peakLead.force': 'Peak under the lead foot',
    'peakLead.timesBodyWeight': 'Peak, × body weight',
    'peakLead.time': 'Time of the peak, s',
    'peakLead.beforeImpact': 'Peak before impact, s',
    'peakLead.afterLeadArmParallel': 'Peak after lead arm parallel, s',
    rampRate: 'Rise to the peak, × body weight a second',
    'quality.ok': 'Trace can be read',
    'quality.problems': 'Remarks',
  },
  example: {
    says: 'A front-foot swing: the lead share goes from 62 % in early downswing on to 79 % at impact.',
    request: exampleSwing(),
    published: [
      { path: 'leadSharePctAt.takeaway', value: 54, tolerance: 1e-5, source: G1 },
      { path: 'leadSharePctAt.impact', value: 79, tolerance: 1e-5, source: G1 },
      { path: 'styleChangePct', value: 17, tolerance: 1e-4, source: G1 },
      { path: 'style', value: 'front-foot', tolerance: 0, source: G1 },
    ],
  },
};
