import { Entity, PrimaryColumn } from 'typeorm';
import { Ascii, Json, Moment } from '../columns';

/** What was answered to a request that named its own key: asked again with the same body, the same is answered. */
@Entity('client_request')
export class ClientRequest {
  @PrimaryColumn({ type: 'uuid' }) personId!: string;
  @PrimaryColumn({ type: 'uuid' }) clientKey!: string;
  @Ascii(64) requestHash!: string;
  @Json({ nullable: true }) reply!: unknown;
  @Moment() at!: Date;
}
