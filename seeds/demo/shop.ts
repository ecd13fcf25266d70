/** An invented shop in an invented country. */
export const DEMO_SHOP = {
  name: 'Larkfield Steelworks',
  address: ['14 Foundry Lane', 'Larkfield, Eastmark 20417'],
  phone: '+1 555 0142',
  email: 'quotes@larkfield.example',
  paper: 'Letter',
  system: 'US',
  taxRegions: [
    { region: 'Eastmark', rate: '0.0725' },
    { region: 'Westmark', rate: '0.06' },
    { region: 'Northreach', rate: '0' },
  ],
  approvalLimit: '60000',
} as const
