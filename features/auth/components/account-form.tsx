import type { ReactNode } from 'react';
import { EntryFrame } from '@/components/layout';
import { Banner, Link, Row, Stack, Text } from '@/components/ui';
import type { ApiProblem } from '@/client/problem';
import { EntryAside } from './entry-aside';

interface AccountFormProps {
  title: string;
  onSubmit: () => void;
  /** What went wrong, when no field says it. */
  problem: ApiProblem | null;
  other: { question: string; label: string; href: string };
  children: ReactNode;
}

/** The frame that signing in and signing up share. */
export function AccountForm({ title, onSubmit, problem, other, children }: AccountFormProps) {
  return (
    <EntryFrame aside={<EntryAside />}>
      <Stack gap={16}>
        <Text kind="head" heading={1}>
          {title}
        </Text>
        {problem ? (
          <Banner kind="danger" announce>
            {problem.message}
          </Banner>
        ) : null}
        <form
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            onSubmit();
          }}
        >
          <Stack gap={16}>{children}</Stack>
        </form>
        <Row justify="between">
          <Text>{other.question}</Text>
          <Link href={other.href}>{other.label}</Link>
        </Row>
      </Stack>
    </EntryFrame>
  );
}
