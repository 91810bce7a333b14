import ArrowRight from 'lucide-react-native/icons/arrow-right';
import type { Subject } from '@/shared/contracts/threads';
import { PageTitle } from '@/components/layout';
import { Plate, plateWords } from '@/components/residue';
import { Button, Row } from '@/components/ui';
import { subjectPath, subjectWords } from '../subject-of-key';
import type { SubjectThread } from '../apply-thread-event';

interface ThreadHeadingProps {
  projectId: string;
  subject: Subject;
  thread: SubjectThread;
}

/** What the thread hangs on, with the way there. */
export function ThreadHeading({ projectId, subject, thread }: ThreadHeadingProps) {
  const { residue, caption } = thread;
  const href = subjectPath(projectId, subject, residue);
  return (
    <div style={{ paddingBottom: 8 }}>
      <Row gap={12} wrap justify="between">
        <Row gap={12} wrap style={{ flexShrink: 1 }}>
          {residue ? <Plate size={32} {...plateWords(residue)} /> : null}
          <PageTitle quietOnPhone>{caption}</PageTitle>
        </Row>
        {href ? (
          <Button kind="quiet" href={href} icon={ArrowRight}>
            {`Open the ${subjectWords[subject.kind]}`}
          </Button>
        ) : null}
      </Row>
    </div>
  );
}
