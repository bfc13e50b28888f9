#include "gainsay/cli/sha256.h"

#include "gainsay/core/require.h"

#include <openssl/evp.h>

#include <array>
#include <cstddef>

namespace gainsay::cli {
namespace {

constexpr std::size_t kBytes = 32;
using Digest = std::array<unsigned char, kBytes>;

Digest digest_of(std::string_view bytes) {
  Digest digest{};
  unsigned length = 0;
  const int done =
      EVP_Digest(bytes.data(), bytes.size(), digest.data(), &length, EVP_sha256(), nullptr);
  GAINSAY_REQUIRE(done == 1 && length == kBytes, "libcrypto computes SHA-256");
  return digest;
}

}  // namespace

std::string sha256_hex(std::string_view bytes) {
  static constexpr std::string_view kDigits = "0123456789abcdef";
  std::string out;
  for (const unsigned char byte : digest_of(bytes)) {
    out += kDigits[byte >> 4];
    out += kDigits[byte & 15];
  }
  return out;
}

std::string sha256_base64(std::string_view bytes) {
  const Digest digest = digest_of(bytes);
  // Four characters for each three bytes begun, and the zero that EVP_EncodeBlock writes last.
  std::array<unsigned char, 4 * ((kBytes + 2) / 3) + 1> text{};
  const int length = EVP_EncodeBlock(text.data(), digest.data(), static_cast<int>(kBytes));
  return {text.begin(), text.begin() + length};
}

}  // namespace gainsay::cli
