import { Redirect } from 'expo-router';
import { projectsPath } from '@/client/paths';

export default function Home() {
  return <Redirect href={projectsPath() as never} />;
}
