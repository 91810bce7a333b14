import { Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import type { Annotation } from '../../../shared/contracts';
import { Ascii, Json, LongText, Made } from '../../db/columns';

/** What the annotation said at one time; a change adds one, none is lost. */
@Entity('annotation_version')
export class AnnotationVersion extends Made {
  @ForeignKey('Annotation') @PrimaryColumn({ type: 'uuid' }) annotationId!: string;
  @PrimaryColumn({ type: 'int' }) number!: number;
  @Ascii(40) kind!: Annotation['kind'];
  @LongText() text!: string;
  @Ascii(8) confidence!: Annotation['confidence'];
  @Json() evidence!: Annotation['evidence'];
}
