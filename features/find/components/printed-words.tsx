import FlaskConical from 'lucide-react-native/icons/flask-conical';
import { Mark, Time } from '@/components/ui';
import type { OwnProject } from '@/shared/contracts/projects';

interface PrintedWordsProps {
  project: Pick<OwnProject, 'name' | 'teamName' | 'invented'>;
  by: string;
}

/** In the title block of a printed page: whose paper it is, who printed it and when. */
export function PrintedWords({ project, by }: PrintedWordsProps) {
  const now = new Date().toISOString();
  return (
    <>
      {project.invented ? <Mark icon={FlaskConical}>invented data</Mark> : null}
      <span>
        {`${project.name}, ${project.teamName}; printed by ${by}, `}
        <Time iso={now} form="day" /> <Time iso={now} form="clock" />
      </span>
    </>
  );
}
