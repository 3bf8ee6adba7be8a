import { ROLE_NAMES } from '#src/access/viewer.ts';
import { mailPayloads } from '#src/schemas/mail.ts';
import { unsealToken } from '#src/services/mail/sealToken.ts';

/**
 * What a stored message says, with its links. Links begin with PUBLIC_URL and nothing else.
 *
 * @throws {Error} for a kind or a payload that is not ours
 */
export function messageProps(kind: string, payload: unknown) {
  switch (kind) {
    case 'outrun': {
      const { outrunId, ...rest } = mailPayloads.outrun.parse(payload);
      return { kind, props: { ...rest, href: linkTo(`/outruns/${outrunId}`) } } as const;
    }
    case 'invite': {
      const { sealed, academyName, role } = mailPayloads.invite.parse(payload);
      const href = linkTo(`/invite/${unsealToken(sealed)}`);
      return { kind, props: { academyName, roleName: ROLE_NAMES[role], href } } as const;
    }
    case 'reset': {
      const { sealed } = mailPayloads.reset.parse(payload);
      return { kind, props: { href: linkTo(`/reset/${unsealToken(sealed)}`) } } as const;
    }
    default:
      throw new Error('no message of this kind');
  }
}

const linkTo = (path: string): string =>
  new URL(path, process.env['PUBLIC_URL'] || `http://127.0.0.1:${process.env['PORT'] || '4321'}`).toString();
