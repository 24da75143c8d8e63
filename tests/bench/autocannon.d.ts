/** The part of autocannon we use; the package ships no types. */
declare module 'autocannon' {
  interface Result {
    requests: { average: number };
    latency: { p50: number; p97_5: number; p99: number };
    non2xx: number;
    errors: number;
  }
  export default function autocannon(options: {
    url: string;
    connections: number;
    duration: number;
  }): Promise<Result>;
}
