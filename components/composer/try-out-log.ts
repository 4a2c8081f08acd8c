import { ReadingLog } from '@/components/sheet/reading-log';

/** A log that keeps nothing and sends nothing: readings on a sheet that is only tried out. */
export class TryOutLog extends ReadingLog {
  constructor() {
    super({
      store: { load: async () => [], write: async () => undefined },
      send: () => Promise.reject(new Error('A sheet that is tried out sends nothing.')),
      clockTime: () => '',
    });
  }

  override async commit(): Promise<void> {}
}
