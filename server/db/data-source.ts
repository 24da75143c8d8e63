import { DataSource } from 'typeorm';
import { BenchCopyEntity, BenchEntryEntity, ShopCardEntity } from './entities/bench';
import { CaseEntity, LogEntity, LogTextEntity, ReportEntity, RulingEntity } from './entities/cases';
import {
  CorrectionEntity,
  LetterEntity,
  NoticeEntity,
  NoticeSettingEntity,
} from './entities/notices';
import { MediaEntity, MediaOwnerEntity, MediaUseEntity } from './entities/media';
import { UploadEntity, UploadPartEntity } from './entities/upload';
import { EmailTokenEntity, PersonEntity } from './entities/person';
import { PlanCardEntity, PlanEntity, RevisionEntity } from './entities/plan';
import { CommentEntity, CommentVersionEntity } from './entities/talk';
import { People1764580000000 } from './migrations/1764580000000-people';
import { Plans1764580100000 } from './migrations/1764580100000-plans';
import { TalkAndOrder1764580200000 } from './migrations/1764580200000-talk-and-order';
import { MediaWork1764581100000 } from './migrations/1764581100000-media-work';
import { Uploads1764581200000 } from './migrations/1764581200000-uploads';
import { Notices1764583000000 } from './migrations/1764583000000-notices';

export const entities = [
  PersonEntity,
  EmailTokenEntity,
  PlanEntity,
  RevisionEntity,
  PlanCardEntity,
  MediaEntity,
  MediaOwnerEntity,
  MediaUseEntity,
  UploadEntity,
  UploadPartEntity,
  BenchCopyEntity,
  BenchEntryEntity,
  ShopCardEntity,
  CommentEntity,
  CommentVersionEntity,
  CorrectionEntity,
  LetterEntity,
  NoticeEntity,
  NoticeSettingEntity,
  CaseEntity,
  ReportEntity,
  RulingEntity,
  LogEntity,
  LogTextEntity,
];
export const migrations = [
  People1764580000000,
  Plans1764580100000,
  TalkAndOrder1764580200000,
  MediaWork1764581100000,
  Uploads1764581200000,
  Notices1764583000000,
];

/** The database at an address; the schema changes by migrations only. */
export function makeDataSource(url: string, poolSize = 10): DataSource {
  return new DataSource({
    type: 'postgres',
    url,
    entities,
    migrations,
    synchronize: false,
    poolSize,
    migrationsTransactionMode: 'each',
  });
}

export default makeDataSource(
  process.env.DATABASE_URL ?? 'postgres://postgres@127.0.0.1:5432/scantling',
);
