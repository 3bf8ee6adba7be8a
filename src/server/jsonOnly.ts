import type { RequestHandler } from 'express';
import { refusal } from '#src/server/refuse.ts';

const calculators = /^\/api\/method\//;

/**
 * The calculators take JSON and nothing else, and say so as a problem document; the framework behind would answer a
 * form or plain text from a program as if another site had sent it.
 */
export const jsonOnly: RequestHandler = (req, res, next) => {
  const isJson = /^application\/json\b/i.test(req.headers['content-type'] ?? '');
  if (req.method !== 'POST' || isJson || !calculators.test(req.path)) return next();
  const body = {
    ...refusal(415, String(res.locals['requestId'] ?? '')),
    title: 'JSON only',
    errors: [{ path: '', message: 'Send the request as application/json' }],
  };
  res.status(415).setHeader('Cache-Control', 'no-store');
  res.type('application/problem+json').send(JSON.stringify(body));
};
