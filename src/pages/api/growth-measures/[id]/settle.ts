import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { settle } from '#src/schemas/settle.ts';
import { settleGrowthMeasure } from '#src/services/settling/settleValue.ts';

export const POST = handle(async (viewer, context) => {
  const { input, done } = await readInput(context, settle);
  await settleGrowthMeasure(viewer, uuidParam(context, 'id'), input);
  return done({ settled: input.verdict }, '/asked');
});
