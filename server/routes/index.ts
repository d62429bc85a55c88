import type { Operation } from '../http/operation';
import { listAuditEvents } from './audit-events';
import { bufferCapacity, publicBufferCapacity } from './buffer-capacity';
import { fractions, publicFractions } from './fractions';
import { livez, readyz } from './health';
import { isoelectricPoint, publicIsoelectricPoint } from './isoelectric-point';
import { issueKey, listKeys, readKey, revokeKey } from './keys';
import { limits } from './limits';
import { mixtures, publicMixtures } from './mixtures';
import { pHForFraction } from './ph-for-fraction';
import { account, chooseOrganization, refreshSession, signIn, signOut } from './sessions';
import {
  listPublicSystems,
  listSystems,
  readPublicSystem,
  readSystem,
  systemFractions,
} from './systems';

/** Every operation there is. */
export const operations: readonly Operation[] = [
  fractions,
  publicFractions,
  systemFractions,
  pHForFraction,
  bufferCapacity,
  publicBufferCapacity,
  isoelectricPoint,
  publicIsoelectricPoint,
  mixtures,
  publicMixtures,
  listSystems,
  readSystem,
  listPublicSystems,
  readPublicSystem,
  signIn,
  refreshSession,
  signOut,
  chooseOrganization,
  account,
  issueKey,
  listKeys,
  readKey,
  revokeKey,
  listAuditEvents,
  limits,
  livez,
  readyz,
];
