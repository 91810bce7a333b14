// Browser flows, faults and fuzz runs take longer than Jest's five seconds.
jest.setTimeout(300_000);
