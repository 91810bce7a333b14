import type { ReactElement } from 'react';
import type { AnnotationAtResidue } from '@/shared/contracts/annotations';
import type { ResidueLabel, ResidueRef } from '@/shared/contracts/common';
import { Evidence, Grade, Plate, plateWords, type EvidenceEdge } from '@/components/residue';
import { color, face } from '@/components/theme';
import { Link, Markdown, Row, Status, Text, Time, type Linkify } from '@/components/ui';
import { residuePath } from '@/client/paths';
import { evidenceEdge } from '../evidence-edge';
import { PinActs } from './pin-acts';

interface PinCardProps {
  projectId: string;
  here: ResidueRef;
  annotation: AnnotationAtResidue;
  names: Linkify<ReactElement>;
}

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);
const isLink = (text: string): boolean => /^https?:\/\/\S+$/.test(text);

/** A statement at a residue: its kind, how it stands, what it says and what supports it. */
export function PinCard({ projectId, here, annotation, names }: PinCardProps) {
  const { kind, status, statusReason, text, pins, viaEquivalence, shape } = annotation;
  const edge: EvidenceEdge | null = viaEquivalence ? 'equivalence' : evidenceEdge(annotation);
  const others = pins.filter(
    (pin) => pin.proteinId !== here.proteinId || pin.residueIndex !== here.residueIndex,
  );
  const name = `${kind}, ${text.slice(0, 40)}`;
  return (
    <article
      aria-label={`${kind}, ${status}${viaEquivalence ? ', by equivalence' : ''}`}
      style={{
        margin: '12px 0 8px',
        font: `400 var(--body-size)/var(--body-line) ${face.text}`,
        ...(viaEquivalence ? { paddingLeft: 12, borderLeft: `1.5px dashed ${color.lineControl}` } : null),
      }}
    >
      <Row gap={10} wrap>
        <h3 style={{ fontSize: 'inherit', fontWeight: 600 }}>{capital(kind)}</h3>
        <Status status={status} />
        {edge ? <Evidence edge={edge} /> : null}
      </Row>
      {viaEquivalence ? (
        <p style={{ color: color.inkSoft, paddingTop: 4, lineHeight: '26px' }}>
          Pinned on{' '}
          <ResiduePlate projectId={projectId} residue={viaEquivalence.residue} evidence="equivalence" /> in{' '}
          <em>{viaEquivalence.residue.organism}</em>, not here. Grade <Grade grade={viaEquivalence.grade} />
        </p>
      ) : null}
      <div style={{ paddingTop: 4 }}>
        <Markdown text={text} linkify={names} />
      </div>
      {!viaEquivalence && others.length > 0 ? (
        <p style={{ paddingTop: 4, lineHeight: '28px' }}>
          {shape === 'pair' ? 'Pair with ' : 'Also on '}
          {others.map((pin) => (
            <ResiduePlate key={`${pin.proteinId}:${pin.residueIndex}`} projectId={projectId} residue={pin} />
          ))}
        </p>
      ) : null}
      <EvidenceList evidence={annotation.evidence} />
      {statusReason && (status === 'contested' || status === 'retired') ? (
        <p style={{ paddingTop: 4 }}>
          <b>{status === 'contested' ? 'Contested: ' : 'Retired: '}</b>
          {statusReason}
        </p>
      ) : null}
      <Text kind="meta" tone="soft" style={{ paddingTop: 4 }}>
        {`confidence ${annotation.confidence}, ${annotation.by.name}, `}
        <Time iso={annotation.at} form="day" />
        {annotation.versionNumber > 1 ? (
          <>
            {`, version ${annotation.versionNumber} by ${annotation.changedBy.name}, `}
            <Time iso={annotation.changedAt} form="day" />
          </>
        ) : null}
      </Text>
      {viaEquivalence ? null : <PinActs projectId={projectId} annotation={annotation} name={name} />}
    </article>
  );
}

function EvidenceList({ evidence }: Pick<AnnotationAtResidue, 'evidence'>) {
  if (evidence.length === 0) return null;
  return (
    <ul aria-label="Evidence" style={{ paddingTop: 4, color: color.inkSoft }}>
      {evidence.map(({ kind, reference }, place) => (
        <li key={place}>
          {kind}
          {reference ? ': ' : ''}
          {isLink(reference) ? <Link href={reference}>{reference}</Link> : reference}
        </li>
      ))}
    </ul>
  );
}

interface ResiduePlateProps {
  projectId: string;
  residue: ResidueLabel;
  evidence?: EvidenceEdge;
}

function ResiduePlate({ projectId, residue, evidence }: ResiduePlateProps) {
  return <Plate {...plateWords(residue)} evidence={evidence} href={residuePath(projectId, residue)} />;
}
