import { registerSW } from 'virtual:pwa-register';
import { newerWorkroom } from './newer-workroom.js';

/** Lets the service worker keep the shell, so that the Workroom opens without network. */
export function keepShell(): void {
  const take = registerSW({ onNeedRefresh: () => newerWorkroom.isReady(() => void take(true)) });
}
