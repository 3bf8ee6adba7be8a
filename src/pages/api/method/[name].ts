import { clientAddress, consumeMethod } from '#src/auth/limits.ts';
import { AppError, notFound } from '#src/errors/appError.ts';
import { handlePublic } from '#src/http/handle.ts';
import { parseBody } from '#src/http/parseBody.ts';
import { problemOf } from '#src/http/problem.ts';
import { findCalculator } from '#src/services/method/findCalculator.ts';
import { runCalculator } from '#src/services/method/runCalculator.ts';

export const POST = handlePublic(async ({ params, request }) => {
  try {
    await consumeMethod(clientAddress(request));
    const calculator = findCalculator(params['name']) ?? notFound('calculator');
    return runCalculator(calculator, (await parseBody(request, calculator.schema)) as object);
  } catch (error) {
    // Programs call this, so even what looks like a form gets its problem said instead of a way back.
    if (error instanceof AppError) return problemOf(error);
    throw error;
  }
});
