import type { Request, Response } from 'express';

const titles: Readonly<Record<number, string>> = {
  400: 'The request cannot be read',
  403: 'The request does not come from this site',
  404: 'Not found',
  405: 'This method is not used here',
  413: 'The body is too large',
  415: 'This content encoding is not taken',
  421: 'This server does not answer for that host',
  500: 'Something went wrong on our side',
  503: 'Not ready, please try again shortly',
};

/** The body of a refusal: says what, and the reference under which the log has it, and nothing else. */
export function refusal(status: number, reference: string): { title: string; status: number; reference: string } {
  return { title: titles[status] ?? 'Refused', status, reference };
}

/** Answers with a refusal: a problem document to the API, a plain sentence to a page. */
export function refuse(req: Request, res: Response, status: number): void {
  const body = refusal(status, String(res.locals['requestId'] ?? ''));
  res.status(status).setHeader('Cache-Control', 'no-store');
  if (req.path.startsWith('/api/')) res.type('application/problem+json').send(JSON.stringify(body));
  else res.type('text/plain').send(`${body.title}. Reference: ${body.reference}\n`);
}
