import { render } from '@react-email/render';
import { createElement, type ReactElement } from 'react';
import { InviteMessage, inviteSubject, type InviteProps } from '#emails/InviteMessage.tsx';
import { OutrunMessage, outrunSubject, type OutrunProps } from '#emails/OutrunMessage.tsx';
import { RESET_SUBJECT, ResetMessage } from '#emails/ResetMessage.tsx';

export type MessageProps =
  | { kind: 'outrun'; props: OutrunProps }
  | { kind: 'invite'; props: InviteProps }
  | { kind: 'reset'; props: { href: string } };

export interface Message {
  subject: string;
  html: string;
  text: string;
}

/** A message as it is sent: subject, HTML that loads nothing, and the same in plain text. */
export async function composeMessage(message: MessageProps): Promise<Message> {
  const [subject, element] = parts(message);
  return { subject, html: await render(element), text: await render(element, { plainText: true }) };
}

function parts(message: MessageProps): [string, ReactElement] {
  switch (message.kind) {
    case 'outrun':
      return [outrunSubject(message.props), createElement(OutrunMessage, message.props)];
    case 'invite':
      return [inviteSubject(message.props), createElement(InviteMessage, message.props)];
    case 'reset':
      return [RESET_SUBJECT, createElement(ResetMessage, message.props)];
  }
}
