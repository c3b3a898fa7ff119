import { Column, Entity, PrimaryColumn } from 'typeorm';
import { v7 } from 'uuid';

/** The outbox: a letter is written in the transaction that causes it and sent afterwards by a task. */
@Entity('mail')
export class Mail {
  @PrimaryColumn('uuid')
  id: string = v7();

  @Column('uuid', { nullable: true })
  workshopId: string | null = null;

  @Column('uuid', { nullable: true })
  accountId: string | null = null;

  @Column('text')
  toAddress: string;

  @Column('text')
  subject: string;

  /** Emptied once sent: letters carry secret links. */
  @Column('text')
  text: string;

  @Column('text')
  html: string;

  @Column('jsonb')
  headers: Record<string, string> = {};

  @Column('text')
  state: 'waiting' | 'sending' | 'sent' | 'failed' = 'waiting';

  @Column('integer')
  attempts: number = 0;

  @Column('text', { nullable: true })
  lastError: string | null = null;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @Column('timestamptz', { nullable: true })
  sentAt: Date | null = null;
}
