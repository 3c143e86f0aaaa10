/**
 * Passwords of ten characters or more that are tried first, in lower case; shorter ones are refused by length.
 * Common practice: runs of the keyboard, doubled words, words with a year. Written from memory.
 */
export const COMMON_PASSWORDS: ReadonlySet<string> = new Set(
	`1234567890 0123456789 0987654321 9876543210 12345678910 123456789a 1234567891 123123123123 123456123456 1122334455
	1qaz2wsx3edc 1q2w3e4r5t 1q2w3e4r5t6y q1w2e3r4t5 q1w2e3r4t5y6 qwertyuiop qwerty12345 qwerty123456 qwertyqwerty
	qwertyuiop123 qwertz12345 asdfghjkl1 asdfghjkl123 asdfasdfasdf zxcvbnm123 zaq12wsxcde abcdefghij abcdefghijk
	abcd123456 abcde12345 abc123abc123 a123456789 a1b2c3d4e5 aa12345678 aa123456789 password10 password12 password123
	password1234 password12345 password2024 password2025 password2026 passwordpassword password!! password123! p@ssword123
	p@ssw0rd123 passw0rd123 mypassword mypassword1 changeme123 changemenow letmein123 letmeinnow welcome123 welcome1234
	welcome2024 welcome2025 welcome2026 administrator admin12345 admin123456 administrator1 rootroot123 superman123
	iloveyou123 iloveyou12 iloveyouso sunshine123 princess123 football123 baseball123 liverpool1 manchester chelsea123
	charlie123 michelle123 jennifer123 summer2024 summer2025 summer2026 winter2024 winter2025 winter2026 spring2025
	spring2026 autumn2025 autumn2026 monday1234 company123 company1234 testtest123 test123456 test1234567 engineering
	engineer123 evendraft123 evendraft1 ventilation ductwork123 airhandling`.split(/\s+/)
);
