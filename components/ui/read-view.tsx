import type { ReactNode } from 'react';
import { Banner } from './banner';
import { Button } from './button';
import { Empty } from './empty';
import { Loading } from './loading';

/** A value that is being read, as a data hook gives it. */
export interface ReadState<Value> {
  data: Value | undefined;
  error: unknown;
  refetch: () => unknown;
}

export interface ReadViewProps<Value> {
  of: ReadState<Value>;
  /** What is read, in words: "the upload". */
  what: string;
  children: (value: Value) => ReactNode;
}

/** Shows what was read; until then that it is being read, or why it can't be and what to do. */
export function ReadView<Value>({ of, what, children }: ReadViewProps<Value>) {
  if (of.data === undefined) {
    if (!of.error) return <Loading>{`Reading ${what}`}</Loading>;
    if (statusOf(of.error) === 404) return <NothingHere />;
    return <ReadAgain of={of} />;
  }
  return (
    <>
      {of.error ? <ReadAgain of={of} /> : null}
      {children(of.data)}
    </>
  );
}

function ReadAgain({ of }: { of: ReadState<unknown> }) {
  const words = of.error instanceof Error ? of.error.message : 'This could not be read.';
  return (
    <Banner kind="warn" action={<Button onPress={() => void of.refetch()}>Read again</Button>}>
      {words}
    </Banner>
  );
}

/** An address that leads nowhere, or to something one may not see: the two look the same. */
export function NothingHere({ action }: { action?: ReactNode }) {
  return (
    <Empty title="Nothing is at this address" action={action}>
      The address may be mistyped, or what was here belongs to a project you are not a member of.
    </Empty>
  );
}

const statusOf = (error: unknown): number | null =>
  typeof error === 'object' && error !== null && 'status' in error ? Number(error.status) : null;
