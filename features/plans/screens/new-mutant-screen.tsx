import { zodResolver } from '@hookform/resolvers/zod';
import { router } from 'expo-router';
import { useEffect, useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { z } from 'zod';
import { PageTitle, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Banner, Button, NothingHere, Row, Stack } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { mutantPath, planPath } from '@/client/paths';
import { useFormDraft } from '@/client/use-form-draft';
import { useRouteParams } from '@/client/use-route-params';
import { useProtein } from '@/features/families';
import { newMutantBody, type Mutant } from '@/shared/contracts/plans';
import type { Host } from '@/shared/sequence/construct/codon-choice';
import { beginningOfChange } from '../change-view';
import { DraftElsewhere } from '../components/draft-elsewhere';
import { PlannersOnly } from '../components/planners-only';
import { MutantFields, type MutantValues } from '../components/mutant-fields';
import { Refusal } from '../components/refusal';
import { useForgetRefusal } from '../use-forget-refusal';
import { useConstructs, useDesign, useMakeMutant } from '../use-plans';

const params = z.object({
  projectId: z.uuid(),
  proteinId: z.uuid().optional(),
  residueIndex: z.coerce.number().int().min(0).optional(),
  constructId: z.uuid().optional(),
  changes: z.string().max(200).optional(),
});
type Given = z.output<typeof params>;
const draftShape: z.ZodType<MutantValues> = z.object({
  proteinId: z.string(),
  changes: z.string(),
  constructId: z.string().nullable(),
  reason: z.string(),
});
const fieldNames = ['proteinId', 'changes', 'constructId', 'reason'] as const;

export function NewMutantScreen() {
  const given = useRouteParams(params);
  if (!given) return <NothingHere />;
  return (
    <PlannersOnly projectId={given.projectId} title="Plan a mutation">
      <NewMutant key={JSON.stringify(given)} {...given} />
    </PlannersOnly>
  );
}

function NewMutant({ projectId, proteinId = '', residueIndex, constructId, changes = '' }: Given) {
  const { hasRail } = useLayout();
  const make = useMakeMutant(projectId);
  const design = useDesign(projectId);
  const [host, setHost] = useState<Host>('ecoli');
  const [made, setMade] = useState<Mutant>();
  const [saidAtField, setSaidAtField] = useState(false);
  const form = useForm<MutantValues>({
    resolver: zodResolver(newMutantBody),
    defaultValues: { proteinId, changes, constructId: constructId ?? null, reason: '' },
  });
  const place = ['mutant', projectId, proteinId, residueIndex ?? '', constructId ?? '', changes].join(':');
  const draft = useFormDraft(place, form, draftShape);
  useForgetRefusal(form, make);
  usePresets(projectId, form, { proteinId, residueIndex, constructId });
  const values = useWatch({ control: form.control });
  const protein = useProtein(projectId, values.proteinId || null).data;
  const construct = useConstructs(projectId).data?.find(({ id }) => id === values.constructId);

  const submit = form.handleSubmit((body) =>
    make.mutate(body, {
      onError: (error) => setSaidAtField(showFieldErrors(error, fieldNames, form.setError)),
      onSuccess: (mutant) => {
        draft.clear();
        if (mutant.constructId === null) {
          router.replace(mutantPath(projectId, mutant.id));
          return;
        }
        setMade(mutant);
        design.mutate(
          {
            mutantId: mutant.id,
            version: mutant.version,
            body: { constructId: mutant.constructId, host },
          },
          { onSuccess: () => router.replace(mutantPath(projectId, mutant.id)) },
        );
      },
    }),
  );
  const busyText = make.isPending ? 'Planning' : design.isPending ? 'Designing primers' : undefined;
  const button =
    made && !design.isPending ? (
      <Button kind="primary" full={!hasRail} href={mutantPath(projectId, made.id)}>
        {`Open ${made.name}`}
      </Button>
    ) : (
      <Button
        kind="primary"
        full={!hasRail}
        busyText={busyText}
        submit={hasRail}
        onPress={hasRail ? undefined : () => void submit()}
      >
        {values.constructId ? 'Plan and design primers' : 'Plan the mutation'}
      </Button>
    );
  return (
    <Screen
      title="Plan a mutation"
      backHref={planPath(projectId)}
      narrow
      actions={button}
      items={[
        {
          key: 'numbering',
          label: 'Numbering',
          value: protein ? `${protein.preferredNumbering}, ${protein.organism}` : 'of the protein',
        },
        { key: 'construct', label: 'Construct', value: construct?.name ?? 'none yet' },
        { key: 'scheme', label: 'Scheme', value: 'complementary pair' },
      ]}
      saved={made ? undefined : 'not planned yet'}
    >
      <form noValidate onSubmit={(event) => void submit(event)}>
        <Stack gap={16}>
          <PageTitle quietOnPhone>Plan a mutation</PageTitle>
          <DraftElsewhere draft={draft} />
          {made ? (
            <Stack gap={12}>
              <Banner kind="good">{`${made.name} is planned in ${made.constructName ?? 'no construct'}.`}</Banner>
              <Refusal outcome="Primers could not be designed" problem={design.error} />
            </Stack>
          ) : (
            <>
              <MutantFields projectId={projectId} form={form} host={host} onHost={setHost} />
              <Refusal outcome="Not planned" problem={saidAtField ? null : make.error} />
            </>
          )}
          {hasRail ? <Row>{button}</Row> : null}
        </Stack>
      </form>
    </Screen>
  );
}

/** What the address brings along: the letter and label of a residue, and the protein of a construct. */
function usePresets(
  projectId: string,
  form: ReturnType<typeof useForm<MutantValues>>,
  { proteinId, residueIndex, constructId }: Pick<Given, 'proteinId' | 'residueIndex' | 'constructId'>,
): void {
  const { setValue, getValues } = form;
  const constructs = useConstructs(projectId).data;
  const presetProtein = useWatch({ control: form.control, name: 'proteinId' });
  const protein = useProtein(projectId, presetProtein || null).data;
  useEffect(() => {
    const construct = constructs?.find(({ id }) => id === constructId);
    if (construct && getValues('proteinId') === '') setValue('proteinId', construct.proteinId);
  }, [constructs, constructId, getValues, setValue]);
  useEffect(() => {
    if (protein && protein.id === proteinId && residueIndex !== undefined && getValues('changes') === '')
      setValue('changes', beginningOfChange(protein, residueIndex));
  }, [protein, proteinId, residueIndex, getValues, setValue]);
}
