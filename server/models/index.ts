import type { Sequelize } from 'sequelize';
import { defineAuditEvent } from './audit-event';
import { defineBlob } from './blob';
import { defineDecision } from './decision';
import { defineDrawing } from './drawing';
import { defineMembership } from './membership';
import { definePerson } from './person';
import { defineRegister } from './register';
import { defineRevision } from './revision';
import { defineRevisionEditor } from './revision-editor';
import { defineSession } from './session';
import { defineShop } from './shop';

/** Every table as a typed model of that connection. */
export function defineModels(sequelize: Sequelize) {
  return {
    shops: defineShop(sequelize),
    people: definePerson(sequelize),
    memberships: defineMembership(sequelize),
    sessions: defineSession(sequelize),
    registers: defineRegister(sequelize),
    blobs: defineBlob(sequelize),
    drawings: defineDrawing(sequelize),
    revisions: defineRevision(sequelize),
    revisionEditors: defineRevisionEditor(sequelize),
    decisions: defineDecision(sequelize),
    auditEvents: defineAuditEvent(sequelize),
  };
}

export type Models = ReturnType<typeof defineModels>;
