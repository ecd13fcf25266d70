export const client = 'client'
