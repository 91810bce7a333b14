import { access } from '@/client/access';
import { sendUpload } from '@/client/upload';
import { idOf, upload } from './support/contract-values';

const person = { id: idOf(900), email: 'ines@lab.example', name: 'Ines' };
const signIn = (accessToken: string) =>
  access.accept({ person, accessToken, expiresAt: '2026-01-01T00:10:00.000Z' });

/** Stands in for the browser's request: keeps what was sent, answers as told. */
class StandIn {
  static answers: { status: number; body: unknown }[] = [];
  static sent: { headers: Record<string, string>; form: [string, unknown][]; address: string }[] = [];
  readonly upload: { onprogress?: (progress: object) => void } = {};
  status = 0;
  responseText = '';
  onload?: () => void;
  onerror?: () => void;
  onabort?: () => void;
  onloadend?: () => void;
  private address = '';
  private readonly headers: Record<string, string> = {};

  open(_method: string, address: string): void {
    this.address = address;
  }

  setRequestHeader(name: string, value: string): void {
    this.headers[name] = value;
  }

  getResponseHeader(): null {
    return null;
  }

  abort(): void {
    this.onabort?.();
    this.onloadend?.();
  }

  send(form: FormData): void {
    const parts: [string, unknown][] = [];
    form.forEach((value: unknown, name: string) => parts.push([name, value]));
    StandIn.sent.push({ headers: this.headers, form: parts, address: this.address });
    const answer = StandIn.answers.shift();
    setTimeout(() => {
      this.upload.onprogress?.({ lengthComputable: true, loaded: 50, total: 100 });
      this.upload.onprogress?.({ lengthComputable: false, loaded: 60, total: 0 });
      if (answer) {
        this.status = answer.status;
        this.responseText = JSON.stringify(answer.body);
        this.onload?.();
      } else this.onerror?.();
      this.onloadend?.();
    }, 0);
  }
}

const request = () => ({
  projectId: idOf(7),
  file: Object.assign(new Blob(['>a\nME-L\n']), { name: 'β c.afa' }),
  fields: { kind: 'alignment' as const, familyId: idOf(2), name: undefined },
});

beforeEach(() => {
  StandIn.sent = [];
  StandIn.answers = [];
  Object.assign(globalThis, { XMLHttpRequest: StandIn });
  signIn('t1');
});
afterEach(() => jest.restoreAllMocks());

test('the fields go before the file, the file under its name, with progress', async () => {
  StandIn.answers = [{ status: 201, body: upload() }];
  const shares: (number | null)[] = [];
  const made = await sendUpload({ ...request(), onProgress: (share) => shares.push(share) });
  expect(made).toEqual(upload());
  expect(shares).toEqual([0.5, null]);
  const [sent] = StandIn.sent;
  expect(sent?.address).toBe(`/api/v1/projects/${idOf(7)}/uploads`);
  expect(sent?.form.map(([name]) => name)).toEqual(['kind', 'familyId', 'file']);
  expect(sent?.form[2]?.[1]).toMatchObject({ name: 'β c.afa' });
  expect(sent?.headers['Content-Type']).toBeUndefined(); // the browser writes it, with the boundary
});

test('a refused token is renewed once, and the file goes again under the same key', async () => {
  StandIn.answers = [
    { status: 401, body: {} },
    { status: 201, body: upload() },
  ];
  const renewed = { person, accessToken: 't2', expiresAt: '2026-01-01T00:20:00.000Z' };
  jest.spyOn(globalThis, 'fetch').mockResolvedValue(new Response(JSON.stringify(renewed)));
  await sendUpload(request());
  const [first, second] = StandIn.sent;
  expect([first, second].map((one) => one?.headers.Authorization)).toEqual(['Bearer t1', 'Bearer t2']);
  expect(first?.headers['Idempotency-Key']).toBe(second?.headers['Idempotency-Key']);
});

test('a line that breaks and a file that is stopped leave it undecided; a refusal has its words', async () => {
  await expect(sendUpload(request())).rejects.toMatchObject({ code: 'offline', undecided: true });
  const stop = new AbortController();
  stop.abort();
  await expect(sendUpload({ ...request(), signal: stop.signal })).rejects.toMatchObject({ code: 'offline' });
  StandIn.answers = [{ status: 413, body: '<html>' }];
  await expect(sendUpload(request())).rejects.toThrow(/larger/);
});
