import { CARE_FOOTER } from '#src/domain/care/careFooter.ts';
import { REFER_RULES, REFER_RULES_NOTE } from '#src/domain/care/referRules.ts';
import type { MethodPage } from '#src/services/method/methodPage.ts';

export const carePage: MethodPage = {
  title: 'Care: pain rules',
  group: 'Decisions',
  sentence: 'When reported pain asks to do less, and when to stop and see a clinician.',
  purpose: [
    'The athlete, a parent or a coach reports pain from 0 to 10, where it is, and how it was the next morning. The rules below decide between carrying on, doing less, and stopping impact and driver until a clinician has looked. Stop and refer comes from here alone and never from performance figures.',
    CARE_FOOTER,
  ],
  formulas: [
    {
      says: 'Stop and refer, under 18: pain of 4 or more; back or bone pain of 2 or more on two days of seven; night pain, numbness or a changed swing',
      tex: String.raw`\begin{aligned} & \text{pain} \ge 4\\ \text{or } & \text{back or bone pain} \ge 2\\ & \text{on two days within } 7\\ \text{or } & \text{night pain or numbness}\\ \text{or } & \text{a changed swing} \end{aligned}`,
    },
    {
      says: 'Reduce, under 18: pain of 2 or 3, a rise over the week before, or a next morning that is missing or above 1',
      tex: String.raw`\begin{aligned} & 2 \le \text{pain} \le 3\\ \text{or } & \text{a rise over the week before}\\ \text{or } & \text{next morning missing or} > 1 \end{aligned}`,
    },
    {
      says: 'At 18 and over, above 5 stops and 3 to 5 reduces; the other lines are the same',
      tex: String.raw`\begin{aligned} \text{pain} > 5 &\Rightarrow \text{stop}\\ 3 \le \text{pain} \le 5 &\Rightarrow \text{reduce} \end{aligned}`,
    },
  ],
  tables: [
    {
      title: 'When to see a clinician',
      says: REFER_RULES_NOTE,
      columns: [{ header: 'Sign' }, { header: 'How soon' }],
      rows: REFER_RULES.map(({ sentence, urgent }) => [sentence, urgent ? 'the same day' : 'soon']),
    },
  ],
  sources: [
    {
      of: 'Pain lines of adults',
      source: 'Thomeé 1997; Silbernagel and others 2007: knee and Achilles rehabilitation',
      tag: 'memory',
    },
    { of: 'The stricter lines under 18', source: 'Marram', tag: 'proposal' },
    {
      of: 'Back pain that comes from arching, and stress injury of the spine in young athletes',
      source: 'International Journal of Sports Physical Therapy, imaging study',
      tag: 'read',
    },
    { of: 'Signs to refer on', source: 'Standard practice in sports medicine', tag: 'memory' },
  ],
  limits: [
    'Not validated in juniors, and not for backs. It errs on the side of stopping.',
    'It knows only what is reported.',
    'It is no diagnosis, and local rules and clinicians go first.',
  ],
  fields: [
    { path: 'under18', label: 'Under 18', kind: 'flag' },
    {
      path: 'reports',
      label: 'Reports, one a line',
      kind: 'rows',
      hint: 'Date, site (back, bone, joint, muscle, other), pain, next morning or a dash; then yes or no for pain at night, numbness, a changed swing: 2026-05-02 back 2 1 no no no',
      columns: [
        { name: 'on', label: 'Date', kind: 'text' },
        { name: 'site', label: 'Site', kind: 'text' },
        { name: 'pain', label: 'Pain', kind: 'number' },
        { name: 'nextMorning', label: 'Next morning', kind: 'number', optional: true },
        { name: 'nightPain', label: 'Pain at night', kind: 'flag', optional: true },
        { name: 'numbness', label: 'Numbness', kind: 'flag', optional: true },
        { name: 'changesSwing', label: 'Changes the swing', kind: 'flag', optional: true },
      ],
    },
  ],
  outputs: {
    level: 'Level',
    reasons: 'Reasons',
    'allowed.impact': 'Jumps and landings allowed',
    'allowed.driver': 'Driver allowed',
    footer: 'Always said',
  },
  example: {
    says: 'Back pain of 2 on two days of one week.',
    request: {
      under18: true,
      reports: [
        { on: '2026-05-02', site: 'back', pain: 2, nextMorning: 1 },
        { on: '2026-05-06', site: 'back', pain: 2, nextMorning: 0 },
      ],
    },
    published: [
      { path: 'level', value: 'stop-and-refer', tolerance: 0, source: 'our own rule (check H3)' },
      { path: 'allowed.driver', value: false, tolerance: 0, source: 'our own rule (check H3)' },
    ],
  },
};
