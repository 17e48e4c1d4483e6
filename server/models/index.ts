import type { Sequelize } from 'sequelize';
import { Alloy } from './alloy.ts';
import { AlloyRevision } from './alloy-revision.ts';
import { Casting } from './casting.ts';
import { CastingMove } from './casting-move.ts';
import { ChargePlan } from './charge-plan.ts';
import { Countersign } from './countersign.ts';
import { CoolingCurve } from './cooling-curve.ts';
import { Crucible } from './crucible.ts';
import { Flask } from './flask.ts';
import { InstrumentReading } from './instrument-reading.ts';
import { Instrument } from './instrument.ts';
import { Lot } from './lot.ts';
import { LotAmendment } from './lot-amendment.ts';
import { LotDocument } from './lot-document.ts';
import { MeltAmendment } from './melt-amendment.ts';
import { MeltEvent } from './melt-event.ts';
import { Melt } from './melt.ts';
import { MetalMovement } from './metal-movement.ts';
import { Photograph } from './photograph.ts';
import { PyrometerCheck } from './pyrometer-check.ts';
import { Reading } from './reading.ts';
import { StockCount } from './stock-count.ts';
import { StudioSettings } from './studio-settings.ts';
import { TerminalEnrolment } from './terminal-enrolment.ts';
import { Terminal } from './terminal.ts';
import { Tree } from './tree.ts';
import { User } from './user.ts';
import { WorkInstructionRevision } from './work-instruction-revision.ts';

const associateMetal = (): void => {
  Lot.hasMany(LotAmendment, { as: 'amendments', foreignKey: 'lotId' });
  Lot.hasMany(LotDocument, { as: 'documents', foreignKey: 'lotId' });
  Lot.belongsTo(AlloyRevision, { as: 'alloyRevision', foreignKey: 'alloyRevisionId' });
  Lot.belongsTo(Melt, { as: 'melt', foreignKey: 'meltId' });
  Lot.belongsTo(User, { as: 'receiver', foreignKey: 'receivedBy' });
  LotAmendment.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  LotDocument.belongsTo(User, { as: 'user', foreignKey: 'userId' });

  MetalMovement.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  MetalMovement.belongsTo(User, { as: 'countersigner', foreignKey: 'countersignedBy' });
  MetalMovement.belongsTo(Terminal, { as: 'terminal', foreignKey: 'terminalId' });
  MetalMovement.belongsTo(Lot, { as: 'lot', foreignKey: 'lotId' });
  MetalMovement.belongsTo(Melt, { as: 'melt', foreignKey: 'meltId' });

  StockCount.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  StockCount.belongsTo(Lot, { as: 'lot', foreignKey: 'lotId' });
  ChargePlan.belongsTo(User, { as: 'user', foreignKey: 'userId' });
};

const associateInstruments = (): void => {
  Instrument.belongsTo(Terminal, { as: 'terminal', foreignKey: 'terminalId' });
  PyrometerCheck.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  InstrumentReading.belongsTo(Flask, { as: 'flask', foreignKey: 'flaskId' });
  CoolingCurve.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  CoolingCurve.belongsTo(Instrument, { as: 'instrument', foreignKey: 'instrumentId' });
};

const associate = (): void => {
  Alloy.hasMany(AlloyRevision, { as: 'revisions', foreignKey: 'alloyId' });
  AlloyRevision.belongsTo(Alloy, { as: 'alloy', foreignKey: 'alloyId' });
  AlloyRevision.belongsTo(User, { as: 'drafter', foreignKey: 'draftedBy' });
  AlloyRevision.belongsTo(User, { as: 'checker', foreignKey: 'checkedBy' });
  AlloyRevision.belongsTo(User, { as: 'approver', foreignKey: 'approvedBy' });

  Flask.hasMany(Casting, { as: 'castings', foreignKey: 'flaskId' });
  Casting.belongsTo(Flask, { as: 'flask', foreignKey: 'flaskId' });
  Casting.belongsTo(Tree, { as: 'tree', foreignKey: 'treeId' });
  Casting.belongsTo(AlloyRevision, { as: 'alloyRevision', foreignKey: 'alloyRevisionId' });
  Casting.belongsTo(User, { as: 'planner', foreignKey: 'plannedBy' });
  Casting.belongsTo(User, { as: 'caster', foreignKey: 'casterId' });
  Casting.belongsTo(Melt, { as: 'melt', foreignKey: 'meltId' });

  Melt.belongsTo(Casting, { as: 'casting', foreignKey: 'castingId', constraints: false });
  Melt.hasMany(MeltEvent, { as: 'events', foreignKey: 'meltId' });
  Melt.hasMany(MeltAmendment, { as: 'amendments', foreignKey: 'meltId' });
  Melt.hasMany(Photograph, { as: 'photographs', foreignKey: 'meltId' });
  Melt.belongsTo(AlloyRevision, { as: 'alloyRevision', foreignKey: 'alloyRevisionId' });
  Melt.belongsTo(WorkInstructionRevision, {
    as: 'workInstructionRevision',
    foreignKey: 'workInstructionRevisionId',
  });
  Melt.belongsTo(User, { as: 'opener', foreignKey: 'openedBy' });
  Melt.belongsTo(Terminal, { as: 'terminal', foreignKey: 'terminalId' });

  MeltEvent.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  MeltEvent.belongsTo(Terminal, { as: 'terminal', foreignKey: 'terminalId' });
  MeltAmendment.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  Photograph.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  WorkInstructionRevision.belongsTo(User, { as: 'drafter', foreignKey: 'draftedBy' });
  WorkInstructionRevision.belongsTo(User, { as: 'approver', foreignKey: 'approvedBy' });
};

const classes = {
  Alloy,
  AlloyRevision,
  Casting,
  CastingMove,
  ChargePlan,
  Countersign,
  CoolingCurve,
  Crucible,
  Flask,
  Instrument,
  InstrumentReading,
  Lot,
  LotAmendment,
  LotDocument,
  Melt,
  MeltAmendment,
  MeltEvent,
  MetalMovement,
  Photograph,
  PyrometerCheck,
  Reading,
  StockCount,
  StudioSettings,
  Terminal,
  TerminalEnrolment,
  Tree,
  User,
  WorkInstructionRevision,
};

/** Every model of the product, by name. */
export type Models = typeof classes;

/** Binds every model and association to a database. */
export const initModels = (sequelize: Sequelize): Models => {
  for (const model of Object.values(classes)) model.define(sequelize);
  associate();
  associateMetal();
  associateInstruments();
  return classes;
};
