export const price = 'price'
