#include "gainsay/core/version.h"

namespace gainsay::core {

const char* version() { return GAINSAY_VERSION; }

}  // namespace gainsay::core
