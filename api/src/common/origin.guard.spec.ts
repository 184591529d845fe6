import { allowedOrigins } from './origin.guard';

describe('the origins that may write', () => {
  it('are the public address alone', () => {
    expect([...allowedOrigins('https://brimgate.example/app')]).toEqual(['https://brimgate.example']);
  });

  it('are on loopback all of its names, on the same port', () => {
    expect([...allowedOrigins('http://localhost:3000')]).toEqual([
      'http://127.0.0.1:3000',
      'http://localhost:3000',
      'http://[::1]:3000',
    ]);
  });
});
