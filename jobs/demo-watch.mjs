// Reads process groups from its input ("+12" started, "-12" ended). When the input closes, the demo is gone, even if it was killed
// by force: whatever group is left is ended.
import { createInterface } from 'node:readline';
import { setTimeout as pause } from 'node:timers/promises';

const groups = new Set();
const signalAll = (signal) => {
  for (const group of groups) {
    try {
      process.kill(-group, signal);
    } catch {
      groups.delete(group);
    }
  }
};

for await (const line of createInterface({ input: process.stdin })) {
  const group = Number(line.slice(1));
  if (line.startsWith('+')) groups.add(group);
  else groups.delete(group);
}
signalAll('SIGTERM');
for (let waited = 0; groups.size > 0 && waited < 16; waited += 1) {
  await pause(500);
  signalAll(0);
}
signalAll('SIGKILL');
