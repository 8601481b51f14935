// One holder at a time across processes, by a file holding the holder's process id.
import { readFileSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';

const LOCK = '.deps-lock';
const POLL_MS = 300;
// A process id may be used again by a stranger after a restart: past this age the holder is taken for dead.
const STALE_MS = 15 * 60_000;

function sleep(ms) {
  Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, ms);
}

function readIfThere(path) {
  try {
    return readFileSync(path, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return null;
    throw error;
  }
}

function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

function take() {
  try {
    writeFileSync(LOCK, String(process.pid), { flag: 'wx' });
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  }
}

// Moved aside before it is deleted, so that of two waiters only one clears it.
function clearIfAbandoned() {
  const text = readIfThere(LOCK);
  if (text === null || text === '') return;
  const ageMs = Date.now() - (statSync(LOCK, { throwIfNoEntry: false })?.mtimeMs ?? Date.now());
  if (isAlive(Number(text)) && ageMs < STALE_MS) return;
  const aside = `${LOCK}.${process.pid}`;
  try {
    renameSync(LOCK, aside);
  } catch (error) {
    if (error.code === 'ENOENT') return;
    throw error;
  }
  const moved = readIfThere(aside);
  rmSync(aside, { force: true });
  // Another process took the lock between the look and the move: give it back.
  if (moved !== null && moved !== text) writeFileSync(LOCK, moved, { flag: 'wx' });
}

function release() {
  rmSync(LOCK, { force: true });
}

/** Runs `work` while holding the lock, waiting for whoever holds it now. */
export function whileLocked(work) {
  let told = false;
  while (!take()) {
    if (!told) console.log('Waiting for another install or build in this folder to finish …');
    told = true;
    clearIfAbandoned();
    sleep(POLL_MS);
  }
  process.once('exit', release);
  try {
    work();
  } finally {
    release();
    process.off('exit', release);
  }
}
