/** A refusal as the service words it: `{error: {type, code, param, message}}`. */
export class ApiError extends Error {
  name = 'ApiError'

  /**
   * @param {number} status
   * @param {{ type?: string, code?: string, param?: string, message: string }} error
   */
  constructor(status, { type = 'invalid_request_error', ...error }) {
    super(error.message)
    this.status = status
    this.body = { error: { type, ...error } }
  }
}

/** @returns {ApiError} for a field with a wrong value */
export const wrong = (param, message, code) => new ApiError(400, { param, message, code })

/** @returns {ApiError} for an id that belongs to nothing here */
export const missing = (kind, id, param = 'id') =>
  new ApiError(404, { code: 'resource_missing', param, message: `No such ${kind}: '${id}'` })
