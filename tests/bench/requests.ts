import autocannon from 'autocannon';
import { EXAMPLE_PLAN } from '../../src/lib';
import { heading, line } from './report.ts';

const SECONDS = 6;
const CONNECTIONS = 8;

/** Requests a second of an estimate beside those of routes that do nothing, in the same run. */
export async function benchRequests(baseUrl: string): Promise<void> {
  heading(`Requests a second, ${CONNECTIONS} connections, the load tool on the same machine`);
  const json = { 'content-type': 'application/json', origin: new URL(baseUrl).origin };
  const estimate = { method: 'POST', headers: json, body: JSON.stringify(EXAMPLE_PLAN) };
  await rate(baseUrl, '/api/estimates', 200, estimate); // warms the server up
  const empty = await rate(baseUrl, '/healthz', 200);
  const nothing = await rate(baseUrl, '/api/no-such-thing', 404);
  const estimates = await rate(baseUrl, '/api/estimates', 200, estimate);
  line('POST /api/estimates', estimates, 'requests/s');
  line('an empty answer (/healthz)', empty, 'requests/s');
  line('an API route that finds nothing', nothing, 'requests/s');
  line('POST /api/estimates of an empty answer', estimates / empty, 'times');
  line('POST /api/estimates of an API route that finds nothing', estimates / nothing, 'times');
}

async function rate(
  baseUrl: string,
  path: string,
  status: number,
  request: { method?: string; headers?: Record<string, string>; body?: string } = {},
): Promise<number> {
  const { requests, errors, statusCodeStats } = await autocannon({
    url: new URL(path, baseUrl).href,
    connections: CONNECTIONS,
    duration: SECONDS,
    ...request,
  });
  const others = Object.keys(statusCodeStats).filter((code) => code !== String(status));
  if (errors > 0 || others.length > 0) {
    throw new Error(`${path} answered ${others.join(', ')} instead of ${status}, ${errors} errors`);
  }
  return requests.average;
}
