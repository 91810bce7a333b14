// A server on a database of its own may take longer to start than Jest's five seconds when the machine is busy.
jest.setTimeout(60_000);
