import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { setPriority } from 'node:os';
import { join } from 'node:path';
import { Injectable, Logger } from '@nestjs/common';
import { Refusal } from '../../common/refusal';
import { type EngineAnswer, type EngineReady, type EngineRequest, tooMuch } from './engine-messages';

/** All the memory a decoding process may take, bytes: more would starve the API beside it. */
const memoryBytes = 512 * 1024 * 1024;
/** No file that a decoding process writes is longer: the uncompressed master of the longest strip is 88 MB. */
const fileBytes = 128 * 1024 * 1024;
/** Honest pictures of 100 megapixels take up to 2.4 s to decode. */
const decodeWithinMs = 5_000;
/** Works on a master that has been decoded before; AVIF at 1920 px takes about a second. */
const makeWithinMs = 30_000;
const startWithinMs = 20_000;
/** Below the API's own: pages are answered first. */
const niceness = 10;

/** A picture's upright size in pixels. */
export interface PictureSize {
  readonly widthPx: number;
  readonly heightPx: number;
}

type WithoutKind<T> = T extends unknown ? Omit<T, 'kind'> : never;
type Ask<K extends EngineRequest['kind']> = WithoutKind<Extract<EngineRequest, { kind: K }>>;

/**
 * The only way to sharp. Each session is a process of its own with bounded memory and time: a hostile picture
 * kills that process and nothing else.
 */
@Injectable()
export class ImageEngine {
  private readonly sessions = new Set<EngineSession>();

  async open(): Promise<EngineSession> {
    const session = new EngineSession(spawnWorker(), () => this.sessions.delete(session));
    this.sessions.add(session);
    await session.ready();
    return session;
  }

  /** Opens a session for one piece of work and ends it whatever happens. */
  async use<T>(work: (session: EngineSession) => Promise<T>): Promise<T> {
    const session = await this.open();
    try {
      return await work(session);
    } finally {
      session.end();
    }
  }

  onApplicationShutdown(): void {
    for (const session of this.sessions) session.end();
  }
}

/** One decoding process. Ask one thing at a time. */
export class EngineSession {
  private readonly log = new Logger('image-engine');
  private waiting: ((answer: EngineAnswer | EngineReady | null) => void) | null = null;
  private gone = false;

  constructor(
    private readonly child: ChildProcess,
    ended: () => void,
  ) {
    child.on('message', (answer: EngineAnswer | EngineReady) => this.waiting?.(answer));
    child.on('error', (fault) => this.log.error(`The decoding process: ${fault.message}`));
    child.stderr?.on('data', (said: Buffer) => this.log.warn(said.toString().trim().slice(0, 500)));
    child.once('close', () => {
      this.gone = true;
      this.waiting?.(null);
      ended();
    });
  }

  /** @throws Error where the process did not come up */
  async ready(): Promise<void> {
    const answer = await this.next(startWithinMs, () => undefined);
    if (!answer || !('ready' in answer)) throw new Error('The decoding process did not start');
  }

  /** Decodes an original whole, once, into an upright sRGB master. @throws Refusal 422 `image.refused` */
  inspect(request: Ask<'inspect'>): Promise<PictureSize> {
    return this.ask({ kind: 'inspect', ...request }, decodeWithinMs);
  }

  /** Makes one smaller form. @throws Refusal 422 `image.refused` */
  make(request: Ask<'make'>): Promise<PictureSize> {
    return this.ask({ kind: 'make', ...request }, makeWithinMs);
  }

  end(): void {
    this.child.kill('SIGKILL');
  }

  private async ask(request: EngineRequest, withinMs: number): Promise<PictureSize> {
    const answer = await this.next(withinMs, () => this.child.send(request));
    if (answer && 'ok' in answer && answer.ok) return { widthPx: answer.widthPx, heightPx: answer.heightPx };
    const sentence = answer && 'ok' in answer && !answer.ok ? answer.sentence : tooMuch;
    throw new Refusal(422, 'image.refused', sentence);
  }

  /** The process's next message; null where it died or was ended because it took too long. */
  private async next(withinMs: number, begin: () => void): Promise<EngineAnswer | EngineReady | null> {
    if (this.gone) return null;
    const timer = setTimeout(() => this.end(), withinMs);
    try {
      return await new Promise((resolve) => {
        this.waiting = resolve;
        begin();
      });
    } finally {
      clearTimeout(timer);
      this.waiting = null;
    }
  }
}

function spawnWorker(): ChildProcess {
  const limits = [`--data=${memoryBytes}`, `--fsize=${fileBytes}`, '--core=0'];
  const node = [process.execPath, '--max-old-space-size=128', ...workerScript()];
  const child = spawn('prlimit', [...limits, ...node], {
    stdio: ['ignore', 'ignore', 'pipe', 'ipc'],
    // Nothing of the API's own environment: it holds passwords.
    env: {
      PATH: process.env['PATH'],
      MALLOC_ARENA_MAX: '2',
      UV_THREADPOOL_SIZE: '2',
      TSX_TSCONFIG_PATH: process.env['TSX_TSCONFIG_PATH'],
    },
  });
  if (child.pid !== undefined) setPriority(child.pid, niceness);
  return child;
}

/** As built; straight from the source (tests, scripts) through tsx. */
function workerScript(): string[] {
  const built = join(__dirname, 'image-worker.js');
  return existsSync(built)
    ? [built]
    : ['--import', 'tsx', '--conditions', 'source', join(__dirname, 'image-worker.ts')];
}
