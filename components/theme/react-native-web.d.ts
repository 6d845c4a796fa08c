import 'react-native';

/** What react-native-web understands beyond React Native's own types. */
declare module 'react-native' {
  interface ViewProps {
    /** `{ part: 'header' }` becomes `data-part="header"`. */
    dataSet?: Readonly<Record<string, string>> | undefined;
    /** Makes a real anchor. */
    href?: string | undefined;
    hrefAttrs?: Readonly<{ target?: 'blank'; rel?: string }> | undefined;
    'aria-pressed'?: boolean | undefined;
    onKeyDown?: ((event: { readonly key: string; readonly shiftKey: boolean; preventDefault: () => void }) => void) | undefined;
    'aria-describedby'?: string | undefined;
    'aria-current'?: 'page' | 'step' | undefined;
    'aria-haspopup'?: 'menu' | 'dialog' | undefined;
    'aria-controls'?: string | undefined;
    'aria-roledescription'?: string | undefined;
  }
  interface TextProps {
    dataSet?: Readonly<Record<string, string>> | undefined;
    href?: string | undefined;
    tabIndex?: 0 | -1 | undefined;
    'aria-level'?: number | undefined;
    'aria-current'?: 'page' | 'step' | undefined;
  }
  interface TextInputProps {
    'aria-invalid'?: boolean | undefined;
    'aria-required'?: boolean | undefined;
    'aria-describedby'?: string | undefined;
  }
}
