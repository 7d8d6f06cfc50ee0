/** The demonstration's own company. All of it is invented: no such postcode area, no such telephone exchange in use. */
export const company = {
  name: 'Linkfell Ltd',
  street: '1 Slate Wharf',
  town: 'Skelhow',
  district: 'Quernfell',
  postcode: 'QF1 2LF',
  email: 'help@linkfell.example',
  privacyEmail: 'privacy@linkfell.example',
  partnersEmail: 'partners@linkfell.example',
  phone: '01632 960100',
  hours: 'Monday to Friday, 9:00 to 17:00, UK time',
  companyNumber: '00000412',
  vatNumber: 'GB 000 4801 05',
} as const;
