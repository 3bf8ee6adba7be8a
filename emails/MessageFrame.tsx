import { Body, Container, Head, Heading, Hr, Html, Link, Preview, Text } from '@react-email/components';
import type { ReactNode } from 'react';

interface Props {
  title: string;
  children: ReactNode;
  /** The one thing to do, with its full address. */
  link: { href: string; label: string };
}

const TEXT = { color: '#22302b', fontSize: '16px', lineHeight: '24px' };

/** What every message has: no picture, nothing loaded, one link written out in full. */
export function MessageFrame({ title, children, link }: Props) {
  return (
    <Html lang="en">
      <Head />
      <Preview>{title}</Preview>
      <Body style={{ backgroundColor: '#ffffff', fontFamily: 'sans-serif', margin: 0 }}>
        <Container style={{ maxWidth: '560px', padding: '24px' }}>
          <Heading as="h1" style={{ color: '#22302b', fontSize: '22px', lineHeight: '30px' }}>
            {title}
          </Heading>
          {children}
          <Text style={TEXT}>
            {link.label}:<br />
            <Link href={link.href} style={{ color: '#1d5c4a', wordBreak: 'break-all' }}>
              {link.href}
            </Link>
          </Text>
          <Hr />
          <Text style={{ ...TEXT, fontSize: '14px' }}>Marram sends this once. Please do not answer this message.</Text>
        </Container>
      </Body>
    </Html>
  );
}

/** A paragraph of a message. */
export const Paragraph = ({ children }: { children: ReactNode }) => <Text style={TEXT}>{children}</Text>;
