import type { Annotation } from '@/shared/contracts/annotations';
import { List, ReadView, Sheet, Stack, Text, Time } from '@/components/ui';
import type { AnnotationVersion } from '../apply-annotation-event';
import { useAnnotationVersions } from '../use-annotations';
import { Difference } from './difference';

interface VersionsProps {
  projectId: string;
  annotation: Annotation;
  open: boolean;
  onClose: () => void;
}

/** All texts of a statement, the newest first, each with what it changed. */
export function Versions({ projectId, annotation, open, onClose }: VersionsProps) {
  const versions = useAnnotationVersions(projectId, open ? annotation.id : null);
  return (
    <Sheet open={open} title="Versions of this pin" onClose={onClose}>
      {open ? (
        <ReadView of={versions} what="the versions">
          {(list) => (
            <List label="Versions" rows={list} keyOf={({ number }) => String(number)}>
              {(version) => (
                <Version
                  version={version}
                  before={list.find(({ number }) => number === version.number - 1)}
                />
              )}
            </List>
          )}
        </ReadView>
      ) : null}
    </Sheet>
  );
}

function Version({ version, before }: { version: AnnotationVersion; before: AnnotationVersion | undefined }) {
  const { number, kind, text, confidence, evidence, by, at } = version;
  return (
    <Stack gap={4} style={{ paddingVertical: 10 }}>
      <Text kind="small">
        <b>Version {number}</b>, {by.name}, <Time iso={at} />
      </Text>
      <Difference before={before?.text ?? text} after={text} />
      <Text kind="meta" tone="soft">
        {[
          kind,
          `confidence ${confidence}`,
          ...evidence.map((one) => `${one.kind} ${one.reference}`.trim()),
        ].join(', ')}
      </Text>
    </Stack>
  );
}
