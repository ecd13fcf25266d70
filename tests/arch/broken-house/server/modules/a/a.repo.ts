export const secret = 'secret'
