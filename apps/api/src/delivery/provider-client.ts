import twilio from 'twilio';

type Request = twilio.RequestClient['request'];

/** The SDK's HTTP client with the provider's origin replaced, for a stand-in or a proxy; the rest is the SDK's own. */
class OtherOrigin extends twilio.RequestClient {
  constructor(private readonly origin: string) {
    super({ timeout: 15_000, keepAlive: true });
  }

  override request: Request = (options) => {
    const { pathname, search } = new URL(options.uri);
    return super.request({ ...options, uri: this.origin + pathname + search });
  };
}

/**
 * The text-message provider's SDK for an account.
 *
 * @param baseUrl another origin than the provider's own, without a path
 */
export function providerClient(accountSid: string, authToken: string, baseUrl?: string): twilio.Twilio {
  const httpClient: twilio.RequestClient = baseUrl
    ? new OtherOrigin(new URL(baseUrl).origin)
    : new twilio.RequestClient({ timeout: 15_000, keepAlive: true });
  return twilio(accountSid, authToken, { httpClient });
}
