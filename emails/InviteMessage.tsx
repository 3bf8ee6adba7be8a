import { MessageFrame, Paragraph } from '#emails/MessageFrame.tsx';

export interface InviteProps {
  academyName: string;
  /** As people say it: `swing coach`, `parent`. */
  roleName: string;
  href: string;
}

/** The subject line. */
export const inviteSubject = ({ academyName }: Pick<InviteProps, 'academyName'>): string =>
  `${academyName} invites you to Marram`;

/** To an address that the director typed. No child is named. */
export function InviteMessage({ academyName, roleName, href }: InviteProps) {
  return (
    <MessageFrame title={inviteSubject({ academyName })} link={{ href, label: 'See the invitation and accept it' }}>
      <Paragraph>
        {academyName} keeps its juniors’ strength and swing in Marram and invites you to join as {roleName}.
      </Paragraph>
      <Paragraph>
        The link is for this address alone, works once, and ends after 7 days. If you did not expect it, do nothing.
      </Paragraph>
    </MessageFrame>
  );
}
