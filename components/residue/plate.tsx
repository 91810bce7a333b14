import { color, type Part } from '@/components/theme';
import { Link } from '@/components/ui/link';
import { plateBand, plateFrame, type PlateSize } from './plate-style';
import { shortLabel, spokenResidue, type ResidueWords } from './residue-words';

export interface PlateProps extends ResidueWords {
  part: Part;
  size?: PlateSize;
  selected?: boolean;
  /** An address makes the plate a link. */
  href?: string;
  /** Without an address: makes the plate a button. */
  onPress?: () => void;
}

/** The engraved label of one residue: band in the colour of its part, edge as sure as the evidence. */
export function Plate({ part, size = 22, selected = false, href, onPress, ...residue }: PlateProps) {
  const evidence = residue.evidence ?? 'observed';
  const style = plateFrame(size, evidence, selected);
  const name = spokenResidue(residue);
  const content = (
    <>
      <span style={plateBand(size, part, evidence)} />
      <span aria-hidden style={{ marginRight: '.42em', color: color.inkSoft }}>
        {residue.family}
      </span>
      <b
        aria-hidden
        style={{ fontWeight: 700, textDecoration: residue.struck ? 'line-through 2px' : undefined }}
      >
        {shortLabel(residue)}
      </b>
      <span className="sr-only">{name}</span>
    </>
  );
  if (href) {
    return (
      <Link href={href} className="plate plate-link" style={style} current={selected ? 'true' : undefined}>
        {content}
      </Link>
    );
  }
  if (onPress) {
    return (
      <button
        type="button"
        className="plate plate-link"
        style={style}
        aria-pressed={selected}
        onClick={onPress}
      >
        {content}
      </button>
    );
  }
  return (
    <span className="plate" style={style}>
      {content}
    </span>
  );
}
