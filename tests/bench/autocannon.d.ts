// The package has no types of its own; this is the part of it that is used.
declare module 'autocannon' {
  interface Options {
    url: string;
    method?: string;
    headers?: Record<string, string>;
    body?: string;
    connections?: number;
    duration?: number;
  }
  interface Result {
    requests: { average: number };
    latency: { p50: number; p99: number };
    errors: number;
    statusCodeStats: Record<string, { count: number }>;
  }
  export default function autocannon(options: Options): Promise<Result>;
}
