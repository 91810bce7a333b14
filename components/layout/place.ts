import type { IconShape } from '@/components/ui';

/** One place of the product in the rail or the bottom bar. */
export interface Place {
  key: string;
  label: string;
  icon: IconShape;
  href: string;
  /** How much waits there; spoken with the place's name. */
  badge?: number;
}
