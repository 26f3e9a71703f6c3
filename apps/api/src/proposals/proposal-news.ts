import { Injectable } from '@nestjs/common';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { UnitOfWork } from '../database/unit-of-work';
import type { Proposal } from './models/proposal.model';

/** Tells the house, once committed, that a proposal changed. */
@Injectable()
export class ProposalNews {
  constructor(
    private readonly events: EventEmitter2,
    private readonly work: UnitOfWork,
  ) {}

  /** Emits `proposal.changed` after the running transaction. */
  changed({ id, districtId }: Proposal): void {
    this.work.afterCommit(() => this.events.emit('proposal.changed', { proposalId: id, districtId }));
  }
}
