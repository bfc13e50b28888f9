#include "gainsay/cli/sha256.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

// NIST, "Examples with intermediate values", SHA-256, one-block message "abc"; and the empty
// message of the NIST test vectors (SHA256ShortMsg, Len = 0).
TEST(Sha256, GivesThePublishedDigests) {
  EXPECT_EQ(sha256_hex("abc"), "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
  EXPECT_EQ(sha256_hex(""), "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855");
}

// The same digest of the empty message as W3C's Subresource Integrity and RFC 4648 write it: common
// practice in policies of pages.
TEST(Sha256, IsWrittenInBase64ForPolicies) {
  EXPECT_EQ(sha256_base64(""), "47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU=");
}

}  // namespace
}  // namespace gainsay::cli
