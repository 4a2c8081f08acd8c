import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { freePort } from './ports.mjs';
import { runMarker } from './processes.mjs';

const withTsx = ['--import', 'tsx'];

/** What every process of a run gets: our surroundings without the administrator's address, and the run's mark. */
export function baseEnvironment(data) {
  const { DATABASE_URL: _administrator, NODE_ENV: _mode, ...rest } = process.env;
  return {
    ...rest,
    [runMarker]: data.folder,
    TZ: 'UTC',
    NEXT_TELEMETRY_DISABLED: '1',
    AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
  };
}

/** Settings for mail and files: those given from outside, or the stand-ins on free ports. */
export async function chooseServices(data, secrets) {
  const { SMTP_URL, S3_ENDPOINT } = process.env;
  const mailPort = SMTP_URL ? undefined : await freePort();
  const filesPort = S3_ENDPOINT ? undefined : await freePort();
  const env = {
    ...(mailPort && { SMTP_URL: `smtp://127.0.0.1:${mailPort}` }),
    ...(filesPort && {
      S3_ENDPOINT: `http://127.0.0.1:${filesPort}`,
      S3_BUCKET: 'witnessmark',
      S3_ACCESS_KEY_ID: secrets.filesAccessKey,
      S3_SECRET_ACCESS_KEY: secrets.filesSecretKey,
    }),
  };
  const standIns = {
    ...(mailPort && {
      mail: {
        script: 'db/server/fake-mail.ts',
        env: { FAKE_MAIL_PORT: String(mailPort), FAKE_MAIL_FOLDER: data.inside('mail') },
      },
    }),
    ...(filesPort && {
      files: {
        script: 'db/server/fake-files.ts',
        env: {
          FAKE_FILES_PORT: String(filesPort),
          FAKE_FILES_FOLDER: data.inside('files'),
          S3_ACCESS_KEY_ID: secrets.filesAccessKey,
        },
      },
    }),
  };
  return { env, standIns };
}

/** How to run one TypeScript program of the project. */
export function program(root, script, env) {
  return { command: process.execPath, args: [...withTsx, path.join(root, script)], options: { cwd: root, env } };
}

/** How to run the web server. */
export function webServer(root, { host, port, env }) {
  const next = path.join(root, 'node_modules/next/dist/bin/next');
  return {
    command: process.execPath,
    args: [next, 'start', '-H', host, '-p', String(port)],
    options: { cwd: root, env: { ...env, NODE_ENV: 'production' } },
  };
}

/** Waits until the address answers anything at all. */
export async function waitForAnswer(url, isHopeless, timeoutMs = 60_000) {
  for (const end = Date.now() + timeoutMs; Date.now() < end && !isHopeless(); await sleep(100)) {
    try {
      await fetch(url, { redirect: 'manual', signal: AbortSignal.timeout(5_000) });
      return true;
    } catch {
      // Not yet.
    }
  }
  return false;
}
