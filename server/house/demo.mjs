/** @type {typeof import('./demo.d.mts').demoLines} */
export function demoLines({ people }) {
  const width = (/** @type {'email' | 'password'} */ key) =>
    Math.max(...people.map((person) => person[key].length));
  const [emails, passwords] = [width('email'), width('password')];
  const lines = people.map(({ email, password, name, role }) => {
    const who = role === 'admin' ? `${name}, admin` : name;
    return `  ${email.padEnd(emails)}  ${password.padEnd(passwords)}  ${who}`;
  });
  return people.length === 0 ? [] : ['Demo sign-ins (e-mail, password):', ...lines];
}
