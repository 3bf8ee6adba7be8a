import type { Tx } from '#src/db/client.ts';

/** Valid ground traces of one athlete, newest first, with their figures for either leg as lead. */
export function listGroundTraces(trx: Tx, athleteId: string) {
  return trx
    .selectFrom('ground_trace')
    .leftJoin('device', 'device.id', 'ground_trace.device_id')
    .select([
      'ground_trace.id',
      'ground_trace.recorded_on as recordedOn',
      'ground_trace.swing_no as swingNo',
      'ground_trace.club',
      'ground_trace.measure',
      'ground_trace.sample_rate_hz as sampleRateHz',
      'ground_trace.events',
      'ground_trace.figures',
      'ground_trace.problems',
      'device.name as rig',
    ])
    .where('ground_trace.athlete_id', '=', athleteId)
    .where('ground_trace.state', '=', 'valid')
    .orderBy('ground_trace.recorded_on', 'desc')
    .orderBy('ground_trace.swing_no')
    .execute();
}
