import { Link, type Href } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, type PressableProps, type StyleProp, type ViewStyle } from 'react-native';

export interface AnchorProps {
  readonly href: Href;
  readonly style: (state: { readonly pressed: boolean }) => StyleProp<ViewStyle>;
  readonly spokenLabel?: string | undefined;
  readonly current?: 'page' | 'step' | undefined;
  readonly children: ReactNode;
}

/** A pressable area that is a real anchor: opens in a new tab if asked to, works before scripts do, else navigates without a page load. */
export function Anchor({ href, style, spokenLabel, current, children }: AnchorProps) {
  return (
    <Link href={href} asChild>
      <Area look={style} {...(spokenLabel ? { 'aria-label': spokenLabel } : {})} {...(current ? { 'aria-current': current } : {})}>
        {children}
      </Area>
    </Link>
  );
}

type AreaProps = Omit<PressableProps, 'style' | 'children'> & { readonly look: AnchorProps['style']; readonly style?: unknown; readonly children: ReactNode };

/** Link merges `style` as a plain object and would lose one that depends on the press, so it travels under another name. */
function Area({ look, style: _merged, children, ...rest }: AreaProps) {
  return <Pressable role="link" {...rest} style={look}>{children}</Pressable>;
}
