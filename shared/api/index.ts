import { accountContracts } from './accounts';
import { benchContracts } from './bench';
import { caseContracts } from './cases';
import { type Contract } from './contract';
import { mediaContracts } from './media';
import { noticeContracts } from './notices';
import { planContracts } from './plans';
import { talkContracts } from './talk';
import { uploadContracts } from './uploads';

/** Every route of the API. The server mounts exactly these; the OpenAPI document lists them. */
export const contracts: readonly Contract[] = [
  ...accountContracts,
  ...planContracts,
  ...mediaContracts,
  ...uploadContracts,
  ...benchContracts,
  ...talkContracts,
  ...noticeContracts,
  ...caseContracts,
];
