import { describe, expect, it } from 'vitest';
import { isPermanent, readDeliveryStatus, statusCodeOf } from '@/lib/mail/delivery-status';

describe('a delivery status part (RFC 3464)', () => {
  it('is read group by group, with lines that go on', () => {
    const text = ['Reporting-MTA: dns; mx.example', '', 'Original-Recipient: rfc822;ada@example.test', 'Final-Recipient: RFC822; <Other@Example.test>', 'Action: Failed', 'Status: 5.1.1 (no such user)', 'Diagnostic-Code: smtp; 550 5.1.1', '  no such user', '', 'Final-Recipient: rfc822; bob@example.test', 'Action: delayed', 'Status: 4.4.1', ''].join('\r\n');
    expect(readDeliveryStatus(text)).toEqual([
      { address: 'ada@example.test', action: 'failed', status: '5.1.1', detail: '550 5.1.1 no such user' },
      { address: 'bob@example.test', action: 'delayed', status: '4.4.1', detail: null },
    ]);
  });

  it('passes over groups without a recipient or a known action', () => {
    expect(readDeliveryStatus('Final-Recipient: rfc822; a@example.test\n\nAction: failed\n\nnonsense')).toEqual([]);
    expect(readDeliveryStatus('')).toEqual([]);
  });
});

describe('a status code (RFC 3463)', () => {
  it.each([['5.1.1', '5.1.1'], ['4.999.999', '4.999.999'], ['3.1.1', null], ['5.1', null], ['5.1.1000', null], [undefined, null]])('of "%s" is %s', (said, code) => expect(statusCodeOf(said)).toBe(code));

  it.each([
    ['failed', '5.1.1', true],
    ['failed', null, true],
    ['failed', '4.4.7', false],
    ['failed', '5.2.2', false],
    ['delayed', '4.4.1', false],
    ['delayed', '5.1.1', false],
    ['delivered', '2.0.0', false],
  ] as const)('%s with %s is for good: %s', (action, status, expected) => expect(isPermanent({ action, status })).toBe(expected));
});
