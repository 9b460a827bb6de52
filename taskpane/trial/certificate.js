import { X509Certificate } from "node:crypto";
import { existsSync, readFileSync } from "node:fs";
import { createRequire } from "node:module";

const require = createRequire(import.meta.url);
const certificates = require("office-addin-dev-certs");
const {
  certificateDirectory,
  localhostCertificatePath,
  localhostKeyPath,
} = require("office-addin-dev-certs/lib/defaults");

/**
 * Certificate and key for this machine's localhost, made where the platform's own tools keep them. Nothing is told to trust
 * it here: that changes the machine, so its owner does it, with the command in `advice`.
 */
export async function developmentCertificate() {
  if (!isCurrent(localhostCertificatePath)) {
    certificates.deleteCertificateFiles(certificateDirectory);
    await certificates.generateCertificates();
  }
  const trusted = certificates.getCaCertificateStatus().status === certificates.CertificateStatus.Installed;
  return {
    cert: readFileSync(localhostCertificatePath),
    key: readFileSync(localhostKeyPath),
    advice: trusted ? undefined : "This machine does not trust the certificate yet: npx office-addin-dev-certs install",
  };
}

function isCurrent(path) {
  return existsSync(path) && new Date(new X509Certificate(readFileSync(path)).validTo) > new Date();
}
