import type { ReactNode } from 'react';
import { Form } from '@/components/form';
import { EntryFrame } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Banner, Link, Row, Stack, Text } from '@/components/ui';
import type { ApiProblem } from '@/client/problem';
import { EntryAside } from './entry-aside';

interface AccountFormProps {
  title: string;
  onSubmit: () => void;
  /** What went wrong, when no field says it. */
  problem: ApiProblem | null;
  other: { question: string; label: string; href: string };
  /** Why one is here, when one did not come by oneself. */
  note?: string;
  /** Says on a phone too, above the form, what the product does. */
  introduces?: boolean;
  children: ReactNode;
}

/** The frame that signing in and signing up share. */
export function AccountForm(props: AccountFormProps) {
  const { title, onSubmit, problem, other, note, introduces, children } = props;
  const { hasRail } = useLayout();
  return (
    <EntryFrame aside={<EntryAside />}>
      <Stack gap={16}>
        {introduces && !hasRail ? <EntryAside /> : null}
        <Text kind="head" heading={1}>
          {title}
        </Text>
        {note && !problem ? <Banner>{note}</Banner> : null}
        {problem ? (
          <Banner kind="danger" announce>
            {problem.message}
          </Banner>
        ) : null}
        <Form onSubmit={onSubmit}>{children}</Form>
        <Row justify="between">
          <Text>{other.question}</Text>
          <Link href={other.href} className="lone-link">
            {other.label}
          </Link>
        </Row>
      </Stack>
    </EntryFrame>
  );
}
