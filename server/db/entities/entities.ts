import { Acknowledgment } from './Acknowledgment.ts';
import { Artifact } from './Artifact.ts';
import { ArtifactPart } from './ArtifactPart.ts';
import { Building } from './Building.ts';
import { Change } from './Change.ts';
import { CombinationRow } from './CombinationRow.ts';
import { DrawnTick } from './DrawnTick.ts';
import { ForceRow } from './ForceRow.ts';
import { GravityRow } from './GravityRow.ts';
import { InputTable } from './InputTable.ts';
import { Job } from './Job.ts';
import { LevelRow } from './LevelRow.ts';
import { Mail } from './Mail.ts';
import { Member } from './Member.ts';
import { Office } from './Office.ts';
import { OverrideRow } from './OverrideRow.ts';
import { Person } from './Person.ts';
import { Remark } from './Remark.ts';
import { RemarkReply } from './RemarkReply.ts';
import { Revision } from './Revision.ts';
import { RevisionPart } from './RevisionPart.ts';
import { ScheduleRow } from './ScheduleRow.ts';
import { Session } from './Session.ts';
import { Token } from './Token.ts';
import { WallCheck } from './WallCheck.ts';
import { WallRow } from './WallRow.ts';

/** Every entity, listed once: the data source, the drift test and the migration test read this list. */
export const entities = [
  Office,
  Person,
  Session,
  Token,
  Building,
  Member,
  LevelRow,
  WallRow,
  ForceRow,
  GravityRow,
  CombinationRow,
  OverrideRow,
  InputTable,
  Acknowledgment,
  ScheduleRow,
  Change,
  WallCheck,
  Remark,
  RemarkReply,
  Revision,
  RevisionPart,
  DrawnTick,
  Artifact,
  ArtifactPart,
  Job,
  Mail,
];
