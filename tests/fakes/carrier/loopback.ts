/** Hosts that cannot leave this machine. */
export function isLoopback(hostname: string): boolean {
  return ['127.0.0.1', 'localhost', '::1', '[::1]'].includes(hostname)
}
