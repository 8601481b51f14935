import { fork, type ChildProcess } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { maxMakingMs } from './picture-limits.ts';
import type { MadePicture, PictureAnswer, PictureOrder, PictureRefusal } from './picture-messages.ts';
import { RefusedPicture } from './picture-messages.ts';

/** JavaScript's own heap; pixels stand outside it and are bounded by the size of a picture. */
const heapMegabytes = 256;
/** The HEIC decoder never gives memory back: a process grown past this is replaced before its next picture. */
const recycleAbove = 400 * 1024 * 1024;

const diedWords = 'This picture could not be made: it took more memory than there is. Save it smaller and try again.';
const slowWords = 'This picture could not be made: it took longer than a minute. Save it smaller and try again.';

type Task = Omit<PictureOrder, 'id'>;
interface Waiting {
  readonly order: PictureOrder;
  readonly resolve: (picture: MadePicture) => void;
  readonly reject: (error: Error) => void;
}
interface Running extends Waiting {
  readonly timer: NodeJS.Timeout;
  readonly late: { yes: boolean };
}

function startProcess(): ChildProcess {
  const source = import.meta.url.endsWith('.ts');
  const entry = fileURLToPath(new URL(source ? './picture-process.ts' : './picture-process.js', import.meta.url));
  return fork(entry, [], {
    execArgv: [`--max-old-space-size=${heapMegabytes}`, ...(source ? ['--import', 'tsx'] : [])],
    // none of the site's secrets
    env: { PATH: process.env['PATH'], NODE_ENV: process.env['NODE_ENV'], UV_THREADPOOL_SIZE: '2' },
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
  });
}

/** Makes pictures one after the other in a process of their own, started with the first and again whenever it has died. */
export class PictureMaker {
  readonly #waiting: Waiting[] = [];
  readonly #limitMs: number;
  #running: Running | null = null;
  #child: ChildProcess | null = null;
  #lastId = 0;

  constructor(limitMs: number = maxMakingMs) {
    this.#limitMs = limitMs;
  }

  /** Process id while it lives. */
  get pid(): number | null {
    return this.#child?.pid ?? null;
  }

  /** @throws RefusedPicture when the picture cannot be taken; any other error is ours */
  make(task: Task): Promise<MadePicture> {
    return new Promise((resolve, reject) => {
      this.#waiting.push({ order: { id: ++this.#lastId, ...task }, resolve, reject });
      this.#next();
    });
  }

  #next(): void {
    const next = this.#running ? undefined : this.#waiting.shift();
    if (!next) return;
    // one that died a moment ago may not have been told of yet
    const child = this.#child?.connected ? this.#child : this.#start();
    const late = { yes: false };
    const timer = setTimeout(() => {
      late.yes = true;
      child.kill('SIGKILL');
    }, this.#limitMs);
    this.#running = { ...next, timer, late };
    child.ref();
    child.channel?.ref();
    child.send(next.order);
  }

  #start(): ChildProcess {
    const child = startProcess();
    this.#child = child;
    child.on('message', (answer: PictureAnswer) => this.#answered(child, answer));
    child.on('exit', () => this.#gone(child, null));
    child.on('error', (error) => this.#gone(child, error));
    return child;
  }

  #answered(child: ChildProcess, answer: PictureAnswer): void {
    if (this.#running?.order.id !== answer.id) return;
    if (answer.resident > recycleAbove) this.#letGo(child);
    child.unref();
    child.channel?.unref();
    if (answer.kind === 'made') this.#settle((running) => running.resolve(answer.picture));
    else if (answer.kind === 'refused') this.#refuse(answer.refusal);
    else this.#settle((running) => running.reject(new Error(`picture process: ${answer.fault}`)));
  }

  #letGo(child: ChildProcess): void {
    if (this.#child === child) this.#child = null;
    child.disconnect();
  }

  #gone(child: ChildProcess, error: Error | null): void {
    if (this.#child !== child) return;
    this.#child = null;
    if (error) this.#settle((running) => running.reject(error));
    else this.#refuse({ code: 'bad-input', problem: this.#running?.late.yes ? slowWords : diedWords });
  }

  #refuse({ code, problem }: PictureRefusal): void {
    this.#settle((running) => running.reject(new RefusedPicture(code, problem)));
  }

  #settle(tell: (running: Running) => void): void {
    const running = this.#running;
    this.#running = null;
    if (running) {
      clearTimeout(running.timer);
      tell(running);
    }
    this.#next();
  }
}

/** The one maker of this site. */
export const pictureMaker = new PictureMaker();
