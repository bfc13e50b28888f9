#include "gainsay/cli/letters.h"

namespace gainsay::cli {

std::string letter_of(std::size_t n) {
  std::string letters;
  for (std::size_t rest = n + 1; rest > 0; rest = (rest - 1) / 26) {
    letters.insert(letters.begin(), static_cast<char>('A' + (rest - 1) % 26));
  }
  return letters;
}

}  // namespace gainsay::cli
