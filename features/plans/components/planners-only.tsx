import type { ReactNode } from 'react';
import { PageTitle, Screen } from '@/components/layout';
import { Button, Empty, Loading } from '@/components/ui';
import { planPath } from '@/client/paths';
import { useMay, useProject } from '@/features/projects';

interface PlannersOnlyProps {
  projectId: string;
  title: string;
  children: ReactNode;
}

/** A form for those who may plan; others are told who may. */
export function PlannersOnly({ projectId, title, children }: PlannersOnlyProps) {
  const project = useProject(projectId);
  const may = useMay(projectId);
  if (may('plan')) return children;
  return (
    <Screen title={title} backHref={planPath(projectId)}>
      <PageTitle quietOnPhone>{title}</PageTitle>
      {project.data ? (
        <Empty
          title="Planning is for contributors, curators and leads"
          action={<Button href={planPath(projectId)}>See what is planned</Button>}
        >
          {`You are a ${project.data.role} of this project: you read and export what is planned.`}
        </Empty>
      ) : (
        <Loading>Reading the project</Loading>
      )}
    </Screen>
  );
}
