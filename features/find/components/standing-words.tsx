import CloudOff from 'lucide-react-native/icons/cloud-off';
import Check from 'lucide-react-native/icons/check';
import FlaskConical from 'lucide-react-native/icons/flask-conical';
import { Mark } from '@/components/ui';
import { useConnection } from '@/client/use-live';

/** At the end of every title block: the line, and whether what is shown was made up. */
export function StandingWords({ invented }: { invented: boolean }) {
  const connection = useConnection();
  return (
    <>
      {invented ? <Mark icon={FlaskConical}>invented data</Mark> : null}
      {connection === 'connected' ? <Mark icon={Check}>connected</Mark> : null}
      {connection === 'connecting' ? <Mark>connecting</Mark> : null}
      {connection === 'away' ? (
        <Mark tone="warn" icon={CloudOff}>
          no connection
        </Mark>
      ) : null}
    </>
  );
}
