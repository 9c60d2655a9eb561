const statuses = {
  AccessDenied: 403,
  BadDigest: 400,
  EntityTooLarge: 400,
  IncompleteBody: 400,
  InvalidAccessKeyId: 403,
  InvalidArgument: 400,
  KeyTooLongError: 400,
  MetadataTooLarge: 400,
  MethodNotAllowed: 405,
  NoSuchBucket: 404,
  NoSuchKey: 404,
  NotImplemented: 501,
  PreconditionFailed: 412,
  RequestTimeTooSkewed: 403,
  SignatureDoesNotMatch: 403,
  XAmzContentSHA256Mismatch: 400,
}

/** A refusal as the protocol knows it: its code is what client libraries turn into an error's name. */
export class StoreError extends Error {
  name = 'StoreError'

  /**
   * @param {keyof typeof statuses} code
   * @param {string} message what is wrong and what a right request looks like
   */
  constructor(code, message) {
    super(message)
    this.code = code
    this.status = statuses[code]
  }
}
