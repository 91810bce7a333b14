import { Banner, Time } from '@/components/ui';
import type { LineNews } from '../use-line-news';

/** What a lost line means for the reader: what is old, and what still waits to be sent. */
export function LineNotice({ news }: { news: LineNews }) {
  if (news.kind === 'none') return null;
  if (news.kind === 'back')
    return <Banner kind="good">Connected again. What happened meanwhile is shown now.</Banner>;
  return (
    <Banner kind="warn">
      No connection since <Time iso={news.since} form="clock" />. What you see is as it was then. Messages
      wait here and are sent by themselves; anything else keeps as a draft until you send it.
    </Banner>
  );
}
