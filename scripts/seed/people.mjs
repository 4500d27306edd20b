/** The invented members of the two demo organisations. `id` is the demo scenario's name for an assessor. */
export const PEOPLE = {
  T1: [
    person('Hanne Vos', 'marrowfen', ['PURCHASING_COORDINATOR'], 'Purchasing'),
    person('Margit Sole', 'marrowfen', ['FINANCE_DIRECTOR'], 'Finance director'),
    person('Tomas Lindqvist', 'marrowfen', ['ORGANISATION_ADMIN'], 'Administration'),
    person('Edda Brandt', 'marrowfen', ['AUDITOR'], 'Auditor'),
    person('Ruben Adeyi', 'marrowfen', ['CLINICAL_ASSESSOR'], 'Imaging and cardiology', 'A1', 'Imaging'),
    person(
      'Ilse Marchand',
      'marrowfen',
      ['CLINICAL_ASSESSOR'],
      'Surgery, endoscopy and sterile supply',
      'A2',
      'Day surgery',
    ),
    person(
      'Jonas Prell',
      'marrowfen',
      ['CLINICAL_ASSESSOR'],
      'Outpatient, laboratory and rehabilitation',
      'A3',
      'Laboratory',
    ),
    person(
      'Pia Holm',
      'marrowfen',
      ['CLINICAL_ASSESSOR'],
      'Clinical engineering',
      'A4',
      'Clinical engineering',
    ),
    person('Nora Eik', 'marrowfen', ['REQUESTER'], 'Head of cardiology', undefined, 'Cardiology'),
  ],
  T2: [
    person('Callum Reed', 'brindlecombe', ['PURCHASING_COORDINATOR'], 'Purchasing'),
    person('Priya Nair', 'brindlecombe', ['FINANCE_DIRECTOR'], 'Finance director'),
    person('Owen Hartley', 'brindlecombe', ['ORGANISATION_ADMIN'], 'Administration'),
    person('Edda Brandt', 'marrowfen', ['AUDITOR'], 'Auditor'),
    person('Sian Mercer', 'brindlecombe', ['CLINICAL_ASSESSOR'], 'Dental', 'B1', 'Dental'),
    person('Kofi Lamptey', 'brindlecombe', ['CLINICAL_ASSESSOR'], 'Eye', 'B2', 'Eye'),
    person(
      'Ray Dunmore',
      'brindlecombe',
      ['CLINICAL_ASSESSOR'],
      'Clinical engineering',
      'B3',
      'Clinical engineering',
    ),
    person(
      'Bea Tully',
      'brindlecombe',
      ['REQUESTER'],
      'Head of decontamination',
      undefined,
      'Decontamination',
    ),
  ],
};

function person(name, domain, roles, title, assessor, department) {
  const email = `${name.toLowerCase().replace(' ', '.')}@${domain}.example`;
  return { name, email, roles, title, assessor, department };
}
