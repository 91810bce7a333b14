import type { ReactNode } from 'react';
import { createPortal } from 'react-dom';
import ArrowLeft from 'lucide-react-native/icons/arrow-left';
import { color, face } from '@/components/theme';
import { IconButton } from '@/components/ui';
import { useShellSlots, useStandingWords } from './shell-slots';
import { ContextStrip, TitleBlock, type TitleItem } from './title-block';

export interface ScreenProps {
  /** In the top bar of a phone. The page's heading is <PageTitle> or a big plate within the page. */
  title: string;
  /** Where back leads, on a phone. */
  backHref?: string;
  /** Small buttons in the top bar of a phone. */
  phoneTools?: ReactNode;
  items?: readonly TitleItem[];
  saved?: ReactNode;
  /** What can be done here, under the thumb of a phone; a wide page shows its buttons where they belong. */
  actions?: ReactNode;
  /** `page` scrolls as one; `panes` holds <Panes>, which scroll by themselves. */
  kind?: 'page' | 'panes';
  /** Keeps a page of text or fields to a width that can be read. */
  narrow?: boolean;
  children: ReactNode;
}

/** One screen within the frame: fills the bars around it and holds the page. */
export function Screen(props: ScreenProps) {
  const { title, backHref, phoneTools, items = [], actions, kind = 'page', narrow, children } = props;
  const slots = useShellSlots();
  const standing = useStandingWords();
  const saved =
    props.saved || standing ? (
      <span style={{ display: 'inline-flex', alignItems: 'center', gap: 12 }}>
        {props.saved}
        {standing}
      </span>
    ) : undefined;
  const topBar = (
    <>
      {backHref ? (
        <IconButton icon={ArrowLeft} label="Back" href={backHref} />
      ) : (
        <span style={{ width: 16 }} />
      )}
      <div
        style={{
          flex: 1,
          minWidth: 0,
          overflow: 'hidden',
          textOverflow: 'ellipsis',
          whiteSpace: 'nowrap',
          font: `600 20px/26px ${face.text}`,
          color: color.ink,
        }}
      >
        {title}
      </div>
      {phoneTools}
    </>
  );
  const actionBar = (
    <div
      className="action-bar"
      style={{
        display: 'flex',
        gap: 8,
        padding: '10px 16px',
        background: color.paper,
        borderTop: `1px solid ${color.lineRule}`,
      }}
    >
      {actions}
    </div>
  );
  const hasItems = items.length > 0 || saved !== undefined;
  return (
    <>
      {slots.title ? createPortal(topBar, slots.title) : null}
      {slots.strip && hasItems
        ? createPortal(<ContextStrip items={items} saved={saved} />, slots.strip)
        : null}
      {slots.block && hasItems ? createPortal(<TitleBlock items={items} saved={saved} />, slots.block) : null}
      {slots.actions && actions ? createPortal(actionBar, slots.actions) : null}
      {kind === 'panes' ? (
        children
      ) : (
        <div className="page" style={{ flex: 1, minHeight: 0, overflowY: 'auto' }}>
          <div style={{ maxWidth: narrow ? 720 : undefined }}>{children}</div>
        </div>
      )}
    </>
  );
}
