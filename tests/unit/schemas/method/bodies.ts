import type { CalculatorName } from '#src/schemas/method/calculatorNames.ts';

const legs = { lead: 500, trail: 560, teLeadPct: 3.4, teTrailPct: 3.4 };
const summary = { mean: 1.3, cvPct: 5, n: 5 };
const pair = { day: '2026-05-01', carry: 150, strength: 620, stature: 155, age: 13 };
const events = { takeaway: 0, top: 0.4, leadArmParallel: 0.6, impact: 0.7 };
const rest = [[], [], [], [], [], []];

/** Bodies in every form that the contract names. */
export const GOOD: Readonly<Record<CalculatorName, readonly object[]>> = {
  asymmetry: [
    { lead: [500], trail: [560] },
    { lead: [0], trail: [0], better: 'lower', noise: 'trials' },
    { lead: [1, 2], trail: [3], noise: { cvPct: 4 } },
    { lead: [1], trail: [3], noise: { typicalErrorPct: 3.4 } },
    { lead: [1], trail: [3], noise: { typicalErrorPct: { lead: 3, trail: 4 } } },
  ],
  agreement: [
    {
      pairs: [
        ['lead', 'trail'],
        ['none', 'none'],
      ],
    },
  ],
  reliability: [
    {
      table: [
        [1, 2],
        [3, -4],
      ],
    },
    { table: [[1]] },
  ],
  trend: [
    { x: [1, 2], y: [-1, 4] },
    { x: [1], y: [1], alternative: 'greater' },
  ],
  'jump-height': [{ flightTime: 0.5 }, { takeoffVelocity: 2.3, g: 9.80665, timeToTakeoff: 0.7 }, { flightTime: 0 }],
  'jump-curve': [
    { sampleRate: 1000, force: [490.5, -3] },
    { sampleRate: 499.5, force: [1], g: 9.8 },
  ],
  'push-curve': [
    { sampleRate: 1000, force: [490.5, -3] },
    { sampleRate: 1000, force: [1], bodyWeight: 490, g: 9.8 },
  ],
  maturity: [
    { sex: 'male', age: 12, stature: 150 },
    { sex: 'female', age: 11, stature: 144, sittingHeight: 75, mass: 37 },
  ],
  'growth-velocity': [
    { measures: [{ on: '2024-02-29', stature: 150 }] },
    { measures: [{ on: '2026-01-01', stature: 150 }], measurementError: 0 },
  ],
  'growth-centile': [
    { measure: 'stature', sex: 'male', ageMonths: 120.5, value: 145 },
    { measure: 'bmi', sex: 'female', ageMonths: 12, value: 17 },
    { lms: { l: -1.2, m: 32, s: 0.18 }, value: 40 },
  ],
  'air-density': [
    { temperatureC: 20 },
    { temperatureC: -5, humidityPct: 0, pressurePa: 90_000 },
    { temperatureC: 30, humidityPct: 100, altitudeM: -20 },
  ],
  flight: [
    { ballSpeed: 60, launchDeg: 12, spinRpm: 2800 },
    { ballSpeed: 60, launchDeg: -2, spinRpm: 0, density: 0, wind: -3, model: 'smits-smith' },
    { ballSpeed: 60, launchDeg: 12, spinRpm: 2800, model: 'constant', cd: 0.25, cl: -0.1 },
  ],
  'carry-standard': [
    { shots: [{ ballSpeed: 58, launchDeg: 12, spinRpm: 2800, carry: 180 }], conditions: { temperatureC: 5 } },
    {
      shots: [
        { ballSpeed: 58, launchDeg: null, spinRpm: null, carry: 180 },
        { ballSpeed: 58, carry: 0 },
      ],
      conditions: { temperatureC: 5, altitudeM: 300, wind: -2 },
    },
  ],
  'speed-ratio': [
    { ballSpeed: 78, clubSpeed: 53 },
    { ballSpeed: 0, clubSpeed: 0 },
  ],
  'ground-trace': [
    { sampleRate: 500, lead: [1, 2], trail: [2, 1], events },
    {
      sampleRate: 500,
      lead: [1, 2],
      trail: [2, 1],
      mass: 50,
      events: { ...events, lateBackswing: 0.3, earlyDownswing: 0.5, midDownswing: 0.65, finish: 1 },
    },
  ],
  'session-load': [{ days: [[{ rpe: 6, minutes: 60 }], ...rest] }, { days: [[], ...rest] }],
  'week-change': [{ weeks: [1200, 1360] }, { weeks: [0] }],
  'one-rep-max': [
    { load: 100, reps: 5 },
    { load: 0, reps: 11 },
  ],
  outrun: [
    { leadDeficit: { values: [legs] } },
    {},
    {
      asOf: '2026-06-01',
      divergence: { pairs: [pair, { ...pair, day: 20_000 }], othersRaw: [-4.1], asOf: 3 },
      demand: { peakLead: summary, capacity: summary, programmeMedian: null },
      lateReturn: { earlyDownswing: [63], impact: [51], typicalErrorPct: 4 },
      aheadOfStrength: { others: [], athlete: { strength: 700, clubSpeed: 40 } },
      latePeak: { afterLeadArmParallelMs: [-12.5] },
      delivery: {
        carryChange: 9,
        carryMdc: 6,
        clubSpeedChange: -0.1,
        clubSpeedMdc: 1,
        attackChangeDeg: 2,
        loftChangeDeg: null,
        strengthRisen: false,
      },
      context: {
        hipRotation: [{ lead: 18, trail: 30 }],
        pain: 0,
        velocityInSpurtBand: true,
        driverBallsChangePct: -20,
      },
      policy: { deficitMet: -5, look: 4 },
    },
  ],
  care: [
    { under18: true, reports: [{ on: '2026-05-01', site: 'back', pain: 2 }] },
    {
      under18: false,
      reports: [
        {
          on: '2026-05-01',
          site: 'other',
          pain: 10,
          nextMorning: null,
          nightPain: true,
          numbness: false,
          changesSwing: true,
        },
      ],
    },
  ],
};

/** Bodies as texts, each followed by the paths that it is refused for. */
export const BAD: Readonly<Record<CalculatorName, readonly (readonly [string, ...string[]])[]>> = {
  asymmetry: [
    ['{}', 'lead', 'trail'],
    ['{"lead":[],"trail":[1]}', 'lead'],
    ['{"lead":[1,-1],"trail":[1]}', 'lead.1'],
    ['{"lead":["1"],"trail":[1]}', 'lead.0'],
    ['{"lead":[1e999],"trail":[1]}', 'lead.0'],
    ['{"lead":[null],"trail":1}', 'lead.0', 'trail'],
    ['{"lead":[1],"trail":[1],"better":"more"}', 'better'],
    ['{"lead":[1],"trail":[1],"noise":{"cvPct":-1}}', 'noise.cvPct'],
    ['{"lead":[1],"trail":[1],"noise":{"cvPct":1,"typicalErrorPct":1}}', 'noise'],
    ['{"lead":[1],"trail":[1],"noise":{"typicalErrorPct":{"lead":3}}}', 'noise'],
    ['{"lead":[1],"trail":[1],"noise":"none"}', 'noise'],
  ],
  agreement: [
    ['{}', 'pairs'],
    ['{"pairs":[]}', 'pairs'],
    ['{"pairs":[["lead"]]}', 'pairs.0'],
    ['{"pairs":[["lead","left"]]}', 'pairs.0.1'],
    ['{"pairs":[["lead","trail","none"]]}', 'pairs.0'],
    ['{"pairs":["lead"]}', 'pairs.0'],
  ],
  reliability: [
    ['{}', 'table'],
    ['{"table":[]}', 'table'],
    ['{"table":[[]]}', 'table.0'],
    ['{"table":[[1,2],[3]]}', 'table.1'],
    ['{"table":[[1,2],[3,null]]}', 'table.1.1'],
    ['{"table":[1,2]}', 'table.0', 'table.1'],
  ],
  trend: [
    ['{}', 'x', 'y'],
    ['{"x":[],"y":[]}', 'x', 'y'],
    ['{"x":[1,2],"y":[1]}', 'y'],
    ['{"x":[1,true],"y":[1,2]}', 'x.1'],
    ['{"x":[1],"y":[-1e999]}', 'y.0'],
    ['{"x":[1],"y":[1],"alternative":"both"}', 'alternative'],
    [JSON.stringify({ x: Array.from({ length: 2001 }, (_, i) => i), y: [1] }), 'x'],
  ],
  'jump-height': [
    ['{}', 'flightTime'],
    ['{"flightTime":0.5,"takeoffVelocity":2}', 'flightTime'],
    ['{"flightTime":-0.5}', 'flightTime'],
    ['{"flightTime":"0.5"}', 'flightTime'],
    ['{"takeoffVelocity":2,"g":0}', 'g'],
    ['{"takeoffVelocity":2,"timeToTakeoff":0}', 'timeToTakeoff'],
    ['{"takeoffVelocity":1e999}', 'takeoffVelocity'],
  ],
  'jump-curve': [
    ['{}', 'sampleRate', 'force'],
    ['{"sampleRate":0,"force":[1]}', 'sampleRate'],
    ['{"sampleRate":-1000,"force":[1]}', 'sampleRate'],
    ['{"sampleRate":1000,"force":[]}', 'force'],
    ['{"sampleRate":1000,"force":[1,null,1e999]}', 'force.1', 'force.2'],
    ['{"sampleRate":1000,"force":{"0":1}}', 'force'],
    ['{"sampleRate":1000,"force":[1],"g":-9.81}', 'g'],
  ],
  'push-curve': [
    ['{}', 'sampleRate', 'force'],
    ['{"sampleRate":1e999,"force":[1]}', 'sampleRate'],
    ['{"sampleRate":1000,"force":[]}', 'force'],
    ['{"sampleRate":1000,"force":["a"]}', 'force.0'],
    ['{"sampleRate":1000,"force":[1],"bodyWeight":0}', 'bodyWeight'],
    ['{"sampleRate":1000,"force":[1],"bodyWeight":null}', 'bodyWeight'],
  ],
  maturity: [
    ['{}', 'sex', 'age', 'stature'],
    ['{"sex":"boy","age":12,"stature":150}', 'sex'],
    ['{"sex":"male","age":-1,"stature":0}', 'age', 'stature'],
    ['{"sex":"male","age":12,"stature":150,"sittingHeight":150}', 'sittingHeight'],
    ['{"sex":"male","age":12,"stature":150,"mass":-40}', 'mass'],
  ],
  'growth-velocity': [
    ['{}', 'measures'],
    ['{"measures":[]}', 'measures'],
    ['{"measures":[{"on":"2026-02-30","stature":150}]}', 'measures.0.on'],
    ['{"measures":[{"on":"01/02/2026","stature":150}]}', 'measures.0.on'],
    ['{"measures":[{"on":20260101,"stature":-1}]}', 'measures.0.on', 'measures.0.stature'],
    ['{"measures":[{"on":"2026-01-01","stature":150,"by":"me"}]}', 'measures.0.by'],
    ['{"measures":[{"on":"2026-01-01","stature":150}],"measurementError":-0.3}', 'measurementError'],
  ],
  'growth-centile': [
    ['{"value":145}', 'measure', 'sex', 'ageMonths'],
    ['{"measure":"height","sex":"male","ageMonths":120.5,"value":145}', 'measure'],
    ['{"measure":"stature","sex":"male","ageMonths":-1,"value":145}', 'ageMonths'],
    ['{"measure":"stature","sex":"male","ageMonths":120.5,"value":0}', 'value'],
    ['{"lms":{"l":1,"m":140,"s":0.04},"sex":"male","value":145}', 'sex'],
    ['{"lms":{"l":1,"m":0,"s":-0.04},"value":145}', 'lms.m', 'lms.s'],
    ['{"lms":{"l":1,"m":140},"value":145}', 'lms.s'],
  ],
  'air-density': [
    ['{}', 'temperatureC'],
    ['{"temperatureC":-61}', 'temperatureC'],
    ['{"temperatureC":20,"humidityPct":101}', 'humidityPct'],
    ['{"temperatureC":20,"humidityPct":-1,"pressurePa":1013.25}', 'humidityPct', 'pressurePa'],
    ['{"temperatureC":20,"altitudeM":12000}', 'altitudeM'],
    ['{"temperatureC":20,"pressurePa":101325,"altitudeM":0}', 'altitudeM'],
  ],
  flight: [
    ['{}', 'ballSpeed', 'launchDeg', 'spinRpm'],
    ['{"ballSpeed":-1,"launchDeg":91,"spinRpm":-1}', 'ballSpeed', 'launchDeg', 'spinRpm'],
    ['{"ballSpeed":151,"launchDeg":12,"spinRpm":2800}', 'ballSpeed'],
    ['{"ballSpeed":60,"launchDeg":12,"spinRpm":2800,"density":-1}', 'density'],
    ['{"ballSpeed":60,"launchDeg":12,"spinRpm":2800,"model":"other"}', 'model'],
    ['{"ballSpeed":60,"launchDeg":12,"spinRpm":2800,"model":"constant"}', 'cd', 'cl'],
    ['{"ballSpeed":60,"launchDeg":12,"spinRpm":2800,"model":"constant","cd":0.25}', 'cl'],
  ],
  'carry-standard': [
    ['{}', 'shots', 'conditions'],
    ['{"shots":[],"conditions":{"temperatureC":20}}', 'shots'],
    ['{"shots":[{"ballSpeed":58}],"conditions":{"temperatureC":20}}', 'shots.0.carry'],
    ['{"shots":[{"ballSpeed":58,"carry":-1}],"conditions":{}}', 'shots.0.carry', 'conditions.temperatureC'],
    [
      '{"shots":[{"ballSpeed":58,"carry":1}],"conditions":{"temperatureC":20,"pressurePa":1e5,"altitudeM":0}}',
      'conditions.altitudeM',
    ],
    ['{"shots":[{"ballSpeed":58,"carry":1}],"conditions":{"temperatureC":20,"wind":101}}', 'conditions.wind'],
    ['{"shots":[{"ballSpeed":58,"carry":1}],"conditions":{"temperatureC":20,"rain":true}}', 'conditions.rain'],
  ],
  'speed-ratio': [
    ['{}', 'ballSpeed', 'clubSpeed'],
    ['{"ballSpeed":-1,"clubSpeed":50}', 'ballSpeed'],
    ['{"ballSpeed":70,"clubSpeed":"50"}', 'clubSpeed'],
    ['{"ballSpeed":70,"clubSpeed":1e999}', 'clubSpeed'],
  ],
  'ground-trace': [
    ['{}', 'sampleRate', 'lead', 'trail', 'events'],
    [`{"sampleRate":500,"lead":[1,2],"trail":[1],"events":${JSON.stringify(events)}}`, 'trail'],
    [`{"sampleRate":500,"lead":[1,2],"trail":[1,2,3],"events":${JSON.stringify(events)}}`, 'trail'],
    [`{"sampleRate":500,"lead":[1,-2],"trail":[1,2],"events":${JSON.stringify(events)}}`, 'lead.1'],
    [
      '{"sampleRate":500,"lead":[1,2],"trail":[1,2],"events":{"takeaway":0}}',
      'events.top',
      'events.leadArmParallel',
      'events.impact',
    ],
    [
      `{"sampleRate":500,"lead":[1,2],"trail":[1,2],"events":${JSON.stringify({ ...events, contact: 1 })}}`,
      'events.contact',
    ],
    [`{"sampleRate":500,"lead":[1,2],"trail":[1,2],"mass":0,"events":${JSON.stringify(events)}}`, 'mass'],
  ],
  'session-load': [
    ['{}', 'days'],
    ['{"days":[]}', 'days'],
    ['{"days":[[],[],[],[],[],[]]}', 'days'],
    ['{"days":[[],[],[],[],[],[],[],[]]}', 'days'],
    ['{"days":[[{"rpe":11,"minutes":-1}],[],[],[],[],[],[]]}', 'days.0.0.rpe', 'days.0.0.minutes'],
    ['{"days":[[{"rpe":5}],[],[],[],[],[],[]]}', 'days.0.0.minutes'],
    ['{"days":[1,[],[],[],[],[],[]]}', 'days.0'],
  ],
  'week-change': [
    ['{}', 'weeks'],
    ['{"weeks":[]}', 'weeks'],
    ['{"weeks":[1,-1]}', 'weeks.1'],
    ['{"weeks":"1,2"}', 'weeks'],
  ],
  'one-rep-max': [
    ['{}', 'load', 'reps'],
    ['{"load":-1,"reps":5}', 'load'],
    ['{"load":100,"reps":0}', 'reps'],
    ['{"load":100,"reps":2.5}', 'reps'],
  ],
  outrun: [
    ['{"leadDeficit":{}}', 'leadDeficit.values'],
    ['{"leadDeficit":{"values":[]}}', 'leadDeficit.values'],
    [
      '{"leadDeficit":{"values":[{"lead":-1,"trail":1,"teLeadPct":0,"teTrailPct":3}]}}',
      'leadDeficit.values.0.lead',
      'leadDeficit.values.0.teLeadPct',
    ],
    ['{"divergence":{"pairs":[{"day":"May","carry":1,"strength":1,"stature":1,"age":1}]}}', 'divergence.pairs.0.day'],
    ['{"divergence":{"pairs":[{"day":1.5,"carry":1,"strength":1,"stature":1,"age":1}]}}', 'divergence.pairs.0.day'],
    ['{"demand":{"peakLead":{"mean":1.3,"cvPct":5,"n":2.5},"capacity":1}}', 'demand.peakLead.n', 'demand.capacity'],
    ['{"lateReturn":{"earlyDownswing":[60,61],"impact":[50]}}', 'lateReturn.impact'],
    ['{"lateReturn":{"earlyDownswing":[101],"impact":[50]}}', 'lateReturn.earlyDownswing.0'],
    ['{"latePeak":{"afterLeadArmParallelMs":[null]}}', 'latePeak.afterLeadArmParallelMs.0'],
    ['{"context":{"pain":11}}', 'context.pain'],
    ['{"policy":{"stop":1}}', 'policy.stop'],
    ['{"policy":{"look":"3"}}', 'policy.look'],
    ['{"asOf":"2026-13-01"}', 'asOf'],
  ],
  care: [
    ['{}', 'under18', 'reports'],
    ['{"under18":"yes","reports":[]}', 'under18', 'reports'],
    ['{"under18":true,"reports":[{"on":"2026-05-01","site":"knee","pain":11}]}', 'reports.0.site', 'reports.0.pain'],
    ['{"under18":true,"reports":[{"on":"2026-05-32","site":"back","pain":-1}]}', 'reports.0.on', 'reports.0.pain'],
    [
      '{"under18":true,"reports":[{"on":"2026-05-01","site":"back","pain":1,"nextMorning":11,"nightPain":1}]}',
      'reports.0.nextMorning',
      'reports.0.nightPain',
    ],
  ],
};
