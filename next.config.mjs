/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: [
    'sequelize',
    'mariadb',
    'umzug',
    '@node-rs/argon2',
    'svgdom',
    'pino',
    'nodemailer',
    'piscina',
  ],
  typescript: { ignoreBuildErrors: false },
}

export default config
