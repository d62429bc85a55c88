import type { Operation } from '../http/operation';
import { fractions, publicFractions } from './fractions';
import { livez, readyz } from './health';
import { issueKey, listKeys, readKey, revokeKey } from './keys';
import { limits } from './limits';
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
  limits,
  livez,
  readyz,
];
