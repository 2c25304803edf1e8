import { spawn } from 'node:child_process';

/** Runs a command to its end and shows what it prints; its exit code is the answer. */
export function runShown(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: 'inherit', ...options });
    child.once('error', reject);
    child.once('exit', (code, signal) => resolve(code ?? (signal ? 1 : 0)));
  });
}

/** Runs a command to its end and keeps what it prints. */
export function runKept(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: ['ignore', 'pipe', 'pipe'], ...options });
    let output = '';
    child.stdout.on('data', (part) => (output += part));
    child.stderr.on('data', (part) => (output += part));
    child.once('error', reject);
    child.once('exit', (code, signal) => resolve({ code: code ?? (signal ? 1 : 0), output }));
  });
}

/** Asks a child to stop and waits; after the limit it is killed. */
export function stopChild(child, signal = 'SIGTERM', limitMs = 8_000) {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve();
  return new Promise((resolve) => {
    const hard = setTimeout(() => child.kill('SIGKILL'), limitMs);
    child.once('exit', () => {
      clearTimeout(hard);
      resolve();
    });
    child.kill(signal);
  });
}
