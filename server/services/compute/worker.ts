import { move } from 'piscina';
import { tasks, type TaskName, type TaskRequest } from './tasks';

interface Work {
  readonly name: TaskName;
  readonly request: TaskRequest<TaskName>;
}

/**
 * Runs in a worker thread. The answer is made into bytes here and handed over without a copy, so
 * that the event loop meets neither the maths nor the text of a large answer.
 */
export default function work({ name, request }: Work): unknown {
  return move(new TextEncoder().encode(tasks[name](request)));
}
