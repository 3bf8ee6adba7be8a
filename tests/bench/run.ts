// Ratios measured side by side in one run:  npm run bench
import pg from 'pg';
import { compare, type Comparison } from '#tests/bench/compare.ts';
import { startProduct } from '#tests/config/product.ts';
import { carryStandard } from '#src/domain/driver/carryStandard.ts';
import { flight } from '#src/domain/driver/flight.ts';
import { jumpCurve } from '#src/domain/jump/jumpCurve.ts';

const OF_SQUAD = 'in (select id from athlete where squad_id = $1 and left_on is null)';
/** What the squad page reads, without the query builder. */
const SQUAD_SQL = [
  `select id, name, (select max(held_on) from testing_day d where d.squad_id = squad.id and d.state = 'closed') from squad where id = $1`,
  `select a.*, h.plays, j.marks, j.as_of, o.*,
     (select jsonb_agg(r) from restriction r where r.athlete_id = a.id and r.cleared_at is null)
   from athlete a
   left join lateral (select plays from handedness where athlete_id = a.id order by recorded_at desc limit 1) h on true
   left join lateral (select marks, as_of from judgement where athlete_id = a.id order by made_at desc limit 1) j on true
   left join outrun o on o.athlete_id = a.id and o.state in ('raised', 'discussed', 'in hand')
   where a.squad_id = $1 and a.left_on is null`,
  `select athlete_id, measured_on, stature_m, sitting_height_m, mass_kg from growth_measure where state = 'valid' and athlete_id ${OF_SQUAD} order by measured_on`,
  `select t.athlete_id, d.held_on, x.key, array_agg(t.value_si) filter (where t.state = 'valid' and t.side = 'left') as l,
     array_agg(t.value_si) filter (where t.state = 'valid' and t.side = 'right') as r
   from trial t join testing_day d on d.id = t.testing_day_id join test x on x.id = t.test_id
   where d.state = 'closed' and t.athlete_id ${OF_SQUAD} group by 1, 2, 3, x.id, d.id order by 2`,
  `select s.athlete_id, d.held_on, array_agg(s.carry_standard_m), array_agg(s.carry_m), array_agg(s.club_speed_mps), array_agg(s.ball_speed_mps),
     array_agg(s.launch_deg), array_agg(s.spin_rpm), array_agg(s.attack_deg)
   from shot s join driver_session d on d.id = s.driver_session_id
   where s.club = 'driver' and s.state = 'counted' and s.athlete_id ${OF_SQUAD} group by 1, 2 order by 2`,
];

const LARGEST_SPREAD = 0.25;
const { product, stop } = await startProduct('bench');
const app = new pg.Client({ connectionString: product.env['DATABASE_URL'] });
const superuser = new pg.Client({ connectionString: product.superuserUrl });

try {
  await Promise.all([app.connect(), superuser.connect()]);
  report([await squadPage(), await curveAnalysis(), await standardCarry()]);
} finally {
  await Promise.all([app.end(), superuser.end()]);
  await stop();
}

/** G1: a squad page against its own statements, spelled by hand, and a page of Astro's without data. */
async function squadPage(): Promise<Comparison> {
  const cookie = await signIn();
  const { rows } = await superuser.query<{ squad: string; person: string; academy: string }>(
    `select s.id as squad, s.academy_id as academy, c.person_id as person from squad s
     join squad_coach c on c.squad_id = s.id join membership m on m.person_id = c.person_id and m.role = 'strength_coach'
     where s.name = 'Curlew' limit 1`,
  );
  const { squad, person, academy } = rows[0]!;
  const get = async (path: string, words: string) => {
    const response = await fetch(`${product.baseUrl}${path}`, { headers: { cookie } });
    if (!(await response.text()).includes(words)) throw new Error(`${path} did not say ${words}`);
  };
  return compare('squad page, p50 ÷ (its bare SQL + a bare page)', {
    goal: 1.5,
    measured: () => get(`/squads/${squad}`, 'Emeka Achterberg'),
    baselines: [
      async () => {
        await app.query('begin');
        await app.query(
          `select set_config('app.academy', $1, true), set_config('app.person', $2, true), set_config('app.role', 'strength_coach', true)`,
          [academy, person],
        );
        const counts = [];
        for (const statement of SQUAD_SQL) counts.push((await app.query(statement, [squad])).rowCount);
        await app.query('commit');
        if (counts[1] !== 12) throw new Error('the bare SQL found another squad');
      },
      () => get('/account', 'Tendai Reyes-Lund'),
    ],
  });
}

async function signIn(): Promise<string> {
  const { email, password } = product.accounts.find(({ role }) => role === 'strength coach')!;
  const response = await fetch(`${product.baseUrl}/api/auth/callback/password`, {
    method: 'POST',
    redirect: 'manual',
    headers: { origin: product.baseUrl },
    body: new URLSearchParams({ name: email, password, callbackUrl: '/today' }),
  });
  return response.headers
    .getSetCookie()
    .map((line) => line.split(';')[0])
    .join('; ');
}

/** A curve against the reading of its own file. */
function curveAnalysis(): Promise<Comparison> {
  const force = Array.from({ length: 10_000 }, (_, i) => forceAt(i / 1000));
  const csv = force.map((newtons, i) => `${(i / 1000).toFixed(3)},${newtons.toFixed(1)}`).join('\n');
  return compare('analysis of a 10 s curve at 1000 Hz ÷ splitting its CSV', {
    goal: 3,
    measured: () => {
      const { quality } = jumpCurve({ sampleRate: 1000, force });
      if (!quality.ok) throw new Error(`the curve was refused: ${quality.problems.join(' ')}`);
    },
    baselines: [() => void csv.split('\n').map((line) => line.split(',').map(Number))],
  });
}

/** Standard carries against as many flights. */
function standardCarry(): Promise<Comparison> {
  const shots = Array.from({ length: 40 }, () => ({ ballSpeed: 60, launchDeg: 12, spinRpm: 2700, carry: 170 }));
  return compare('standard carry of 40 shots ÷ 40 flights', {
    goal: 2.5,
    times: 8,
    measured: () => void carryStandard({ shots, conditions: { temperatureC: 10, wind: 1 } }),
    baselines: [
      () => shots.forEach(({ ballSpeed, launchDeg, spinRpm }) => void flight({ ballSpeed, launchDeg, spinRpm })),
    ],
  });
}

/** A made jump of 50 kg (SCIENCE C4), then quiet standing. */
function forceAt(time: number): number {
  const t = time - 2;
  const wobble = Math.sin(time * 700) * 0.8;
  if (t < 0 || t > 1.5) return 490.5 + wobble;
  if (t < 0.3) return 490.5 - 200 * Math.sin((Math.PI * t) / 0.3);
  if (t < 0.7) return 490.5 + 600 * Math.sin((Math.PI * (t - 0.3)) / 0.4);
  if (t < 0.7 + 0.467244) return 0;
  return 490.5 + 700 * Math.exp(-((t - 1.25) ** 2) / 0.002) + wobble;
}

function report(results: readonly Comparison[]): void {
  for (const { name, goal, ratio, best, baselineSpread, ok } of results) {
    const spread = `baseline spread ${(100 * baselineSpread).toFixed(0)} %`;
    const verdict = baselineSpread > LARGEST_SPREAD ? 'not told: the baseline is too unsteady' : ok ? 'ok' : 'OVER';
    process.stdout.write(
      `${ratio.toFixed(2)} (best ${best.toFixed(2)}, goal ${goal})  ${name}; ${spread}: ${verdict}\n`,
    );
  }
  if (results.some(({ ok, baselineSpread }) => !ok && baselineSpread <= LARGEST_SPREAD)) process.exitCode = 1;
}
