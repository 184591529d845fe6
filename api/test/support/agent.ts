import type { NestExpressApplication } from '@nestjs/platform-express';
import request, { type Test } from 'supertest';
import { env } from '../../src/config/env';

export const ORIGIN = new URL(env.PUBLIC_URL).origin;

type Method = 'get' | 'post' | 'put' | 'delete' | 'patch';

/** Sends requests as the pages do: with our origin and, when signed in, the session's cookie. */
export class Agent {
  constructor(
    private readonly app: NestExpressApplication,
    private readonly cookie: string | null,
  ) {}

  get = (path: string) => this.send('get', path);
  post = (path: string) => this.send('post', path);
  put = (path: string) => this.send('put', path);
  delete = (path: string) => this.send('delete', path);
  patch = (path: string) => this.send('patch', path);

  private send(method: Method, path: string): Test {
    const test = request(this.app.getHttpServer())[method](path).set('Origin', ORIGIN);
    return this.cookie === null ? test : test.set('Cookie', this.cookie);
  }
}

export const signedOutAgent = (app: NestExpressApplication) => new Agent(app, null);
