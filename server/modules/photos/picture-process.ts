import type { ChildProcess } from 'node:child_process';
import { startChild } from '#server/children/start-child.ts';
import type { PictureAnswer, PictureRequest } from './picture-messages.ts';

const TIME_LIMIT_MS = 60_000;

const CRASHED: PictureAnswer = {
  type: 'problem',
  code: 'photo.undecodable',
  detail: 'The picture could not be decoded. Save it as a new JPEG and upload it again.',
};

/** A process that decodes pictures one after another; one that a picture brings down is started again for the next. */
export class PictureProcess {
  #child: ChildProcess | null = null;

  async decode(request: PictureRequest, signal: AbortSignal): Promise<PictureAnswer> {
    signal.throwIfAborted();
    const child = (this.#child ??= startChild('picture', { flags: ['--max-old-space-size=256'] }));
    const answer = await new Promise<PictureAnswer | 'aborted'>((resolve) => {
      const timer = setTimeout(() => child.kill('SIGKILL'), TIME_LIMIT_MS);
      const onMessage = (message: unknown) => end(message as PictureAnswer);
      const onExit = () => {
        this.#child = null;
        end(CRASHED);
      };
      const onAbort = () => end('aborted');
      const end = (result: PictureAnswer | 'aborted') => {
        clearTimeout(timer);
        child.off('message', onMessage).off('exit', onExit).off('error', onExit);
        signal.removeEventListener('abort', onAbort);
        resolve(result);
      };
      child.on('message', onMessage).on('exit', onExit).on('error', onExit);
      signal.addEventListener('abort', onAbort);
      child.send(request);
    });
    signal.throwIfAborted();
    return answer === 'aborted' ? CRASHED : answer;
  }

  close(): void {
    this.#child?.kill('SIGKILL');
    this.#child = null;
  }
}
