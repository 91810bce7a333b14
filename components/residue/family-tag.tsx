import { type Part } from '@/components/theme';
import { Link } from '@/components/ui/link';
import { partWords } from './part-glyph';
import { plateBand, plateFrame, type PlateSize } from './plate-style';

export interface FamilyTagProps {
  family: string;
  part: Part;
  size?: PlateSize;
  href?: string;
}

/** A plate with the family's letter only, for chain rows and lists of families. */
export function FamilyTag({ family, part, size = 32, href }: FamilyTagProps) {
  const name = `family ${family}, ${partWords[part]}`;
  const style = {
    ...plateFrame(size, 'observed', false),
    minWidth: size === 22 ? 28 : 36,
    justifyContent: 'center',
  };
  const content = (
    <>
      <span style={plateBand(size, part, 'observed')} />
      <b aria-hidden style={{ fontWeight: 700 }}>
        {family}
      </b>
      <span className="sr-only">{name}</span>
    </>
  );
  if (href) {
    return (
      <Link href={href} className="plate plate-link family-link" style={style}>
        {content}
      </Link>
    );
  }
  return (
    <span className="plate" style={style}>
      {content}
    </span>
  );
}
