import { MessageFrame, Paragraph } from '#emails/MessageFrame.tsx';

/** The subject line. */
export const RESET_SUBJECT = 'Set a new Marram password';

/** To a person who asked for it, or for whom someone else did. */
export function ResetMessage({ href }: { href: string }) {
  return (
    <MessageFrame title={RESET_SUBJECT} link={{ href, label: 'Choose a new password' }}>
      <Paragraph>
        Someone asked to set a new password for this address. The link works once and ends after 10 minutes.
      </Paragraph>
      <Paragraph>If it was not you, do nothing: the password stays as it is.</Paragraph>
    </MessageFrame>
  );
}
