/**
 * Stems that people choose again and again, in lower case without signs; a password is refused
 * when it is one of these with or without digits around it. Common knowledge, written from memory.
 */
export const commonPasswords: ReadonlySet<string> = new Set(
  `
password passwort password passw0rd p4ssword p4ssw0rd qwerty qwertyuiop qwertz qwertzuiop azerty azertyuiop
asdfghjkl asdfgh asdfghjk zxcvbnm zxcvbn qazwsx qazwsxedc letmein letmeinnow welcome welcomeback iloveyou
iloveyousomuch ilovemyself ilovemydog ilovemycat sunshine princess football baseball basketball superman
batman spiderman dragon monkey master shadow michael jennifer jessica ashley charlie donald freedom whatever
trustno trustnoone starwars pokemon computer internet administrator admin adminadmin root rootroot guest
secret secretsecret changeme changemenow default passphrase mypassword mypasswordis thisismypassword
newpassword yourpassword testtest testing testpassword demo demodemo login loginlogin access accessdenied
hello hellohello helloworld abcdef abcdefg abcdefgh abcdefghi abcdefghij abcabc abcd abcdabcd
aaaaaaaa aaaaaaaaaa qqqqqqqqqq zzzzzzzzzz oneoneone correcthorsebatterystaple opensesame
summer winter spring autumn monday tuesday wednesday thursday friday saturday sunday january february march
april june july august september october november december liverpool chelsea arsenal barcelona manchester
hornbeam hornbeamhornbeam woodwork woodworker woodworking woodworkshop workshop carpenter carpentry joinery
sawdust cabinetmaker chisel mechanism mechanisms
`
    .trim()
    .split(/\s+/),
);
