import type { ReactNode } from 'react';
import CloudOff from 'lucide-react-native/icons/cloud-off';
import Check from 'lucide-react-native/icons/check';
import FlaskConical from 'lucide-react-native/icons/flask-conical';
import { Mark } from '@/components/ui';
import type { Connection } from '@/client/realtime';

const lines: Partial<Record<Connection, ReactNode>> = {
  connected: <Mark icon={Check}>connected</Mark>,
  connecting: <Mark>connecting</Mark>,
  away: (
    <Mark tone="warn" icon={CloudOff}>
      no connection
    </Mark>
  ),
};

/**
 * In every title block: the line, and whether what is shown was made up. The strip of a phone is short: `brief` says
 * only what is not as usual. Null when there is nothing to say.
 */
export function standingWords(invented: boolean, connection: Connection, brief: boolean): ReactNode {
  const line = brief && connection !== 'away' ? null : (lines[connection] ?? null);
  if (!invented && line === null) return null;
  return (
    <>
      {invented ? <Mark icon={FlaskConical}>invented data</Mark> : null}
      {line}
    </>
  );
}
