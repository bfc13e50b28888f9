#pragma once

#include <string>
#include <string_view>

namespace gainsay::cli {

/// SHA-256 of the bytes (FIPS 180-4, 2015), computed by OpenSSL's libcrypto: 64 hexadecimal digits.
std::string sha256_hex(std::string_view bytes);

/// The same in base64 (RFC 4648), as a Content-Security-Policy takes it after `sha256-`.
std::string sha256_base64(std::string_view bytes);

}  // namespace gainsay::cli
