import { readFileSync } from 'node:fs';

const fieldsAfterName = (stat) => stat.slice(stat.lastIndexOf(')') + 2).split(' ');

/**
 * Names one life of a process: its id and, where /proc tells, when it began, so that another
 * process that was given the same id later is not taken for it. Undefined when it is gone.
 */
export function lifeOf(pid) {
  try {
    process.kill(pid, 0);
  } catch (fault) {
    if (fault.code === 'ESRCH') return undefined;
  }
  try {
    const [state, ...rest] = fieldsAfterName(readFileSync(`/proc/${pid}/stat`, 'utf8'));
    return state === 'Z' ? undefined : `${pid}@${rest[18]}`;
  } catch {
    return String(pid);
  }
}
