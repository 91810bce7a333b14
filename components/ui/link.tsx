import type { AnchorHTMLAttributes, CSSProperties, ReactNode } from 'react';
import { Link as RouterLink, type Href } from 'expo-router';

export interface LinkProps {
  href: string;
  children: ReactNode;
  /** Spoken instead of the content, where the content alone says too little. */
  label?: string;
  className?: string;
  style?: CSSProperties;
  current?: 'page' | 'true' | 'step';
  /** Take the place of the present address in the history. */
  replace?: boolean;
  id?: string;
  /** -1 where arrows reach it instead: one stop for a whole field of links. */
  tabIndex?: 0 | -1;
}

type AnchorProps = AnchorHTMLAttributes<HTMLAnchorElement> & { onPress?: unknown };

/** The router hands its child a touch handler besides the click; an anchor knows only the click. */
function Anchor({ onPress: _touch, role: _implied, ...rest }: AnchorProps) {
  return <a {...rest} />;
}

const isOutside = (href: string): boolean => /^([a-z][a-z0-9+.-]*:|\/\/)/i.test(href);
const isDownload = (href: string): boolean => href.startsWith('/api/');

/** An anchor: inside the product it navigates without loading the page again, outside it is a plain link. */
export function Link({ href, children, label, className, style, current, replace, id, tabIndex }: LinkProps) {
  const shared = { id, className, style, tabIndex, 'aria-label': label, 'aria-current': current };
  if (isOutside(href)) {
    return (
      <a href={href} rel="noopener noreferrer" target="_blank" {...shared}>
        {children}
      </a>
    );
  }
  if (isDownload(href)) {
    return (
      <a href={href} {...shared}>
        {children}
      </a>
    );
  }
  return (
    <RouterLink href={href as Href} replace={replace} asChild>
      <Anchor {...shared}>{children}</Anchor>
    </RouterLink>
  );
}
