import { offline } from './problem';

/** One of the sample files that lie beside the page, as a file to upload. */
export async function readSample(fileName: string): Promise<File> {
  const response = await fetch(`/samples/${fileName}`).catch(() => null);
  if (!response?.ok) throw offline('The sample could not be fetched. Check the connection, then try again.');
  return new File([await response.blob()], fileName, { type: 'text/plain' });
}
