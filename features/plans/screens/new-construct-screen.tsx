import { zodResolver } from '@hookform/resolvers/zod';
import { router } from 'expo-router';
import { useDeferredValue, useMemo } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { z } from 'zod';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Button, NothingHere, Row, Stack, Text } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { constructPath, planPath } from '@/client/paths';
import { useFormDraft } from '@/client/use-form-draft';
import { useRouteParams } from '@/client/use-route-params';
import { useProtein } from '@/features/families';
import { newConstructBody } from '@/shared/contracts/plans';
import { reverseComplement } from '@/shared/sequence/construct/bases';
import { asFasta, viewCoding } from '../coding-view';
import { CodingFeedback } from '../components/coding-feedback';
import { ConstructFields, type ConstructValues } from '../components/construct-fields';
import { DraftElsewhere } from '../components/draft-elsewhere';
import { PlannersOnly } from '../components/planners-only';
import { RecordChoices } from '../components/record-choices';
import { Refusal } from '../components/refusal';
import { StartChoices } from '../components/start-choices';
import { geneticCodeWords } from '../condition-words';
import type { StartSuggestion } from '../start-suggestions';
import { useForgetRefusal } from '../use-forget-refusal';
import { useMakeConstruct } from '../use-plans';

const params = z.object({ projectId: z.uuid(), proteinId: z.uuid().optional() });
/** A draft may hold less than can be sent. */
const draftShape: z.ZodType<ConstructValues> = z.object({
  name: z.string(),
  dna: z.string(),
  codingStart: z
    .number()
    .nullable()
    .transform((value) => value ?? Number.NaN),
  circular: z.boolean(),
  geneticCode: z.number(),
  proteinId: z.string(),
});
const fieldNames = ['name', 'dna', 'codingStart', 'circular', 'geneticCode', 'proteinId'] as const;

export function NewConstructScreen() {
  const given = useRouteParams(params);
  if (!given) return <NothingHere />;
  return (
    <PlannersOnly projectId={given.projectId} title="Add a construct">
      <NewConstruct projectId={given.projectId} proteinId={given.proteinId} />
    </PlannersOnly>
  );
}

function NewConstruct({ projectId, proteinId = '' }: { projectId: string; proteinId?: string }) {
  const { hasRail } = useLayout();
  const make = useMakeConstruct(projectId);
  const form = useForm<ConstructValues>({
    resolver: zodResolver(newConstructBody),
    defaultValues: { name: '', dna: '', codingStart: 1, circular: false, geneticCode: 11, proteinId },
  });
  const draft = useFormDraft(`construct:${projectId}:${proteinId}`, form, draftShape);
  useForgetRefusal(form, make);
  const values = useDeferredValue(useWatch({ control: form.control }) as ConstructValues);
  const protein = useProtein(projectId, values.proteinId || null).data;
  const { dna, codingStart, circular, geneticCode } = values;
  const view = useMemo(
    () =>
      viewCoding(
        { dna, circular, geneticCode, codingStart: Number.isNaN(codingStart) ? null : codingStart },
        protein,
      ),
    [dna, circular, geneticCode, codingStart, protein],
  );
  const submit = form.handleSubmit((body) =>
    make.mutate(body, {
      onSuccess: (made) => {
        draft.clear();
        router.replace(constructPath(projectId, made.id));
      },
      onError: (error) => void showFieldErrors(error, fieldNames, form.setError),
    }),
  );
  const takeStart = ({ start, strand }: StartSuggestion) => {
    const [record] = view.records;
    if (strand === '-' && record)
      form.setValue('dna', asFasta({ ...record, bases: reverseComplement(record.bases) }));
    form.setValue('codingStart', start, { shouldDirty: true, shouldValidate: true });
  };
  const button = (
    <Button
      kind="primary"
      full={!hasRail}
      busyText={make.isPending ? 'Reading and storing' : undefined}
      submit={hasRail}
      onPress={hasRail ? undefined : () => void submit()}
    >
      Add the construct
    </Button>
  );
  return (
    <Screen
      title="Add a construct"
      backHref={planPath(projectId)}
      kind="panes"
      actions={button}
      items={[
        { key: 'code', label: 'Code', value: geneticCodeWords(geneticCode) },
        { key: 'bases', label: 'Bases', value: view.bases ? `${view.bases.length}, from 1` : 'none yet' },
        { key: 'numbering', label: 'Numbering', value: protein?.preferredNumbering ?? 'of the protein' },
      ]}
      saved="not stored yet"
    >
      <Panes
        name="new-construct"
        panes={[
          {
            key: 'fields',
            label: 'The construct',
            content: (
              <form noValidate style={{ maxWidth: 720 }} onSubmit={(event) => void submit(event)}>
                <Stack gap={16}>
                  <PageTitle quietOnPhone>Add a construct</PageTitle>
                  <DraftElsewhere draft={draft} />
                  <ConstructFields projectId={projectId} form={form} />
                  <Refusal outcome="Not stored" problem={make.error} />
                  {hasRail ? <Row>{button}</Row> : null}
                </Stack>
              </form>
            ),
          },
          {
            key: 'reads',
            label: 'What it reads as',
            widthPixels: 480,
            content: (
              <Stack gap={16}>
                <Text kind="head" heading={2}>
                  What it reads as
                </Text>
                {dna.trim() === '' ? (
                  <Text tone="soft">
                    Paste the DNA: which codon stands at the start, what is encoded and where the first stop
                    is is told here, before anything is stored.
                  </Text>
                ) : null}
                {view.records.length > 1 ? (
                  <RecordChoices
                    records={view.records}
                    protein={protein?.residues}
                    geneticCode={geneticCode}
                    onTake={(record) => form.setValue('dna', asFasta(record), { shouldDirty: true })}
                  />
                ) : null}
                <StartChoices
                  suggestions={view.suggestions}
                  codingStart={codingStart}
                  proteinName={protein?.name ?? 'the protein'}
                  onTake={takeStart}
                />
                <CodingFeedback view={view} dna={dna} codingStart={codingStart} />
              </Stack>
            ),
          },
        ]}
      />
    </Screen>
  );
}
