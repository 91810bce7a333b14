import { useState } from 'react';
import Send from 'lucide-react-native/icons/send';
import { messageText, subjectKey, type Subject } from '@/shared/contracts/threads';
import { TextArea } from '@/components/form';
import { useLayout } from '@/components/theme';
import { Banner, Button, Row, Text } from '@/components/ui';
import type { DraftHandle } from '@/client/use-draft';
import { useTyping } from '@/client/use-live';
import { useOnline } from '../use-online';
import type { PostMessage } from '../use-threads';

interface ComposerProps {
  projectId: string;
  subject: Subject;
  draft: DraftHandle;
  post: PostMessage['post'];
  /** What it is about: "c E59". */
  about: string;
}

/** Where a message is written. Enter makes a new line, Ctrl or Command with Enter sends. */
export function Composer({ projectId, subject, draft, post, about }: ComposerProps) {
  const { hasRail } = useLayout();
  const online = useOnline();
  const { typists, type } = useTyping(projectId, subjectKey(subject));
  const [refusal, setRefusal] = useState<string>();
  const text = draft.text ?? '';

  const send = async () => {
    const checked = messageText.safeParse(text);
    if (!checked.success) return setRefusal(checked.error.issues[0]?.message);
    setRefusal(undefined);
    // A text that came back unchanged keeps its key: should the first sending have arrived, it stays one message.
    const { returned } = draft;
    try {
      await post(text, returned?.text.trim() === text.trim() ? returned.clientKey : undefined);
      await draft.clear();
    } catch {
      setRefusal('This browser could not keep the message. Copy your text, then load the page again.');
    }
  };
  return (
    <form
      className="no-print"
      style={{ display: 'grid', gap: 6, paddingTop: 8 }}
      onSubmit={(event) => {
        event.preventDefault();
        void send();
      }}
    >
      <div style={{ minHeight: 16 }} aria-live="polite">
        <Text kind="meta" tone="soft">
          {typingWords(typists.map(({ name }) => name))}
        </Text>
      </div>
      {draft.elsewhere ? (
        <Banner
          kind="warn"
          action={
            <Button kind="quiet" onPress={draft.takeElsewhere}>
              Add it here
            </Button>
          }
        >
          Another tab holds this draft: {draft.elsewhere.text.slice(0, 80)}
        </Banner>
      ) : null}
      <TextArea
        label={`Message about ${about}`}
        quietLabel
        rows={3}
        placeholder={`Write about ${about}. Residue names such as cE59 become links.`}
        value={text}
        readOnly={draft.text === null}
        error={refusal}
        onChange={(next) => {
          setRefusal(undefined);
          draft.type(next);
          type();
        }}
        onKeyDown={(event) => {
          if (event.key !== 'Enter' || !(event.ctrlKey || event.metaKey)) return;
          event.preventDefault();
          void send();
        }}
      />
      <Row justify="between" wrap>
        <Text kind="meta" tone="soft">
          {text === '' ? (hasRail ? 'Ctrl or Command and Enter sends' : '') : 'draft kept as you type'}
        </Text>
        <Button kind="primary" icon={Send} submit>
          {online ? 'Send' : 'Send later'}
        </Button>
      </Row>
    </form>
  );
}

/** `Teo Marrick is writing`. */
function typingWords(names: readonly string[]): string {
  if (names.length === 0) return '';
  if (names.length > 2) return `${names.length} people are writing`;
  return `${names.join(' and ')} ${names.length === 1 ? 'is' : 'are'} writing`;
}
