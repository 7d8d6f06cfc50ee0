import { problems } from '../common/problems/problem.exception.js';

export class AuthException extends problems({
  'wrong-credentials': { status: 401, title: 'E-mail address and password do not belong together' },
  'too-many-attempts': {
    status: 429,
    title: 'Too many attempts; wait a while, or set a new password by mail',
  },
  'reset-link-spent': { status: 422, title: 'This link has been used or is too old; ask for a new one' },
  'password-too-common': { status: 422, title: 'This password would be guessed early; choose another' },
}) {}
