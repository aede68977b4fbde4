/** Whether a host name is one of those kept for examples (RFC 2606): example.com, .org and .net, and the endings example, test, invalid, localhost. */
export function isExampleDomain(host: string): boolean {
  return /(^|\.)(example|test|invalid|localhost|example\.(com|net|org))\.?$/i.test(host);
}
