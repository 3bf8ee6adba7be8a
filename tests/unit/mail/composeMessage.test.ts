import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { composeMessage, type MessageProps } from '#src/mail/composeMessage.ts';

const HREF = 'https://club.example/somewhere';
const MESSAGES: [string, MessageProps, string, RegExp][] = [
  [
    'an outrun raised',
    { kind: 'outrun', props: { squadName: 'Curlew', level: 'look', risen: false, href: HREF } },
    'An outrun is raised: Look',
    /your squad Curlew is raised at the level Look\./,
  ],
  [
    'a level risen',
    { kind: 'outrun', props: { squadName: 'Curlew', level: 'act', risen: true, href: HREF } },
    'An outrun has risen to Act',
    /The level of an outrun in your squad Curlew is now Act\./,
  ],
  [
    'an invitation',
    { kind: 'invite', props: { academyName: 'Marsh Juniors', roleName: 'parent', href: HREF } },
    'Marsh Juniors invites you to Marram',
    /invites you to join as parent\.[^]*ends after 7 days/,
  ],
  [
    'a reset',
    { kind: 'reset', props: { href: HREF } },
    'Set a new Marram password',
    /works once and ends after 10 minutes/,
  ],
];

describe.each(MESSAGES)('%s', (_, message, subject, words) => {
  it('says the same in text and in HTML, with its one link in full', async () => {
    const composed = await composeMessage(message);
    expect(composed.subject).toBe(subject);
    expect(composed.text.replace(/\s+/g, ' ')).toMatch(words);
    expect(composed.text.match(/https?:\/\/\S+/g)).toEqual([HREF]);
    expect(composed.html).toContain(`href="${HREF}"`);
  });

  it('is small, loads nothing, and speaks of no health', async () => {
    const { html, text } = await composeMessage(message);
    expect(Buffer.byteLength(html)).toBeLessThan(90_000);
    expect(html).not.toMatch(/<img|<script|<link|url\(|@import/i);
    expect(text).not.toMatch(/pain|sore|injur|height|mass|growth|deficit/i);
  });
});

describe('a hostile name', () => {
  it('is text in the message, never markup', async () => {
    const { html } = await composeMessage({
      kind: 'invite',
      props: { academyName: '<script>alert(1)</script>"onload="x', roleName: 'parent', href: HREF },
    });
    expect(html).not.toContain('<script>');
  });

  it('never makes another link', async () => {
    await fc.assert(
      fc.asyncProperty(fc.string({ maxLength: 40 }), async (squadName) => {
        const { html } = await composeMessage({
          kind: 'outrun',
          props: { squadName, level: 'look', risen: false, href: HREF },
        });
        expect(html.match(/href="[^"]*"/g)).toEqual([`href="${HREF}"`]);
      }),
      { numRuns: 40 },
    );
  });
});
