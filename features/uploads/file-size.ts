import { counted } from '@/components/ui/count-words';

/** `21 kB`, `4.1 MB`: decimal units, as file managers show them. */
export function fileSizeWords(bytes: number): string {
  if (bytes < 1000) return counted(bytes, 'byte');
  const kilobytes = Math.round(bytes / 1000);
  if (kilobytes < 1000) return `${kilobytes} kB`;
  const megabytes = bytes / 1_000_000;
  return `${megabytes < 10 ? megabytes.toFixed(1) : Math.round(megabytes)} MB`;
}
