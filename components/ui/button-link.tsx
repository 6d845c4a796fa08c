import type { Href } from 'expo-router';
import { Anchor } from './anchor';
import { ButtonFace, buttonStyle, type ButtonFaceProps } from './button-face';

export interface ButtonLinkProps extends Omit<ButtonFaceProps, 'busy' | 'busyLabel' | 'off'> {
  readonly href: Href;
  readonly grow?: boolean;
  readonly spokenLabel?: string;
}

/** Leads somewhere and looks like a button. */
export function ButtonLink({ href, grow = false, spokenLabel, ...face }: ButtonLinkProps) {
  const { kind = 'filled', size = 'normal', label } = face;
  return (
    <Anchor href={href} spokenLabel={spokenLabel ?? (kind === 'back' ? label : undefined)} style={({ pressed }) => buttonStyle(kind, size, { pressed, grow })}>
      <ButtonFace {...face} />
    </Anchor>
  );
}
