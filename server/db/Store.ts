import type { EntityManager } from 'typeorm';

import { AcknowledgmentRepository } from './repositories/AcknowledgmentRepository.ts';
import { BuildingRepository } from './repositories/BuildingRepository.ts';
import { ChangeRepository } from './repositories/ChangeRepository.ts';
import { PersonRepository } from './repositories/PersonRepository.ts';
import { ScheduleRepository } from './repositories/ScheduleRepository.ts';
import { SessionRepository } from './repositories/SessionRepository.ts';
import { TableRepository } from './repositories/TableRepository.ts';

/** What a piece of work inside the gate may use: the repositories on the open connection, and nothing else. */
export class Store {
  readonly people: PersonRepository;
  readonly sessions: SessionRepository;
  readonly buildings: BuildingRepository;
  readonly tables: TableRepository;
  readonly changes: ChangeRepository;
  readonly schedule: ScheduleRepository;
  readonly acknowledgments: AcknowledgmentRepository;

  constructor(manager: EntityManager) {
    this.people = new PersonRepository(manager);
    this.sessions = new SessionRepository(manager);
    this.buildings = new BuildingRepository(manager);
    this.tables = new TableRepository(manager);
    this.changes = new ChangeRepository(manager);
    this.schedule = new ScheduleRepository(manager);
    this.acknowledgments = new AcknowledgmentRepository(manager);
  }
}
