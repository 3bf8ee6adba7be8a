import { MessageFrame, Paragraph } from '#emails/MessageFrame.tsx';

export interface OutrunProps {
  squadName: string;
  level: 'look' | 'act';
  risen: boolean;
  href: string;
}

const LEVELS = { look: 'Look', act: 'Act' } as const;

/** The subject line. */
export const outrunSubject = ({ level, risen }: Pick<OutrunProps, 'level' | 'risen'>): string =>
  risen ? `An outrun has risen to ${LEVELS[level]}` : `An outrun is raised: ${LEVELS[level]}`;

/** To both coaches: an outrun is raised, or its level has risen. Who it is and why stay behind the sign-in. */
export function OutrunMessage({ squadName, level, risen, href }: OutrunProps) {
  return (
    <MessageFrame title={outrunSubject({ level, risen })} link={{ href, label: 'Who it is and the evidence' }}>
      <Paragraph>
        {risen
          ? `The level of an outrun in your squad ${squadName} is now ${LEVELS[level]}.`
          : `An outrun in your squad ${squadName} is raised at the level ${LEVELS[level]}.`}
      </Paragraph>
      <Paragraph>Both coaches write a note, then you agree a Route together.</Paragraph>
    </MessageFrame>
  );
}
