/** An error of the API, in the shape and with the status its public documentation gives. */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    readonly type: 'invalid_request_error' | 'api_error' | 'card_error' | 'idempotency_error',
    message: string,
    readonly code?: string,
    readonly param?: string,
  ) {
    super(message)
    this.name = 'ApiError'
  }

  body(): unknown {
    return { error: { type: this.type, message: this.message, code: this.code, param: this.param } }
  }
}

export function invalid(message: string, param?: string, code?: string): ApiError {
  return new ApiError(400, 'invalid_request_error', message, code, param)
}

export function missing(what: string, id: string): ApiError {
  return new ApiError(404, 'invalid_request_error', `No such ${what}: '${id}'`, 'resource_missing', 'id')
}
