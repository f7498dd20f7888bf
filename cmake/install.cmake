include(GNUInstallDirs)
include(CMakePackageConfigHelpers)

set(package_dir ${CMAKE_INSTALL_DATADIR}/cmake/convelope)
set(pkgconfig_dir ${CMAKE_INSTALL_DATADIR}/pkgconfig)

install(DIRECTORY include/convelope DESTINATION ${CMAKE_INSTALL_INCLUDEDIR}
        FILES_MATCHING PATTERN "*.hpp")
if(EXISTS ${PROJECT_SOURCE_DIR}/LICENSE)
  install(FILES LICENSE DESTINATION ${CMAKE_INSTALL_DATADIR}/licenses/convelope)
endif()

install(TARGETS convelope EXPORT convelope-targets INCLUDES
        DESTINATION ${CMAKE_INSTALL_INCLUDEDIR})
install(EXPORT convelope-targets NAMESPACE convelope:: DESTINATION ${package_dir})
configure_package_config_file(cmake/convelope-config.cmake.in convelope-config.cmake
                              INSTALL_DESTINATION ${package_dir})
# Before 1.0 a minor step may change a result or a name.
write_basic_package_version_file(convelope-config-version.cmake COMPATIBILITY SameMinorVersion
                                 ARCH_INDEPENDENT)
install(
  FILES ${PROJECT_BINARY_DIR}/convelope-config.cmake
        ${PROJECT_BINARY_DIR}/convelope-config-version.cmake cmake/convelope-boost.cmake
  DESTINATION ${package_dir})

# Relative to the .pc file, so that the installed tree can be moved.
file(RELATIVE_PATH pc_include /prefix/${pkgconfig_dir} /prefix/${CMAKE_INSTALL_INCLUDEDIR})
configure_file(cmake/convelope.pc.in convelope.pc @ONLY)
install(FILES ${PROJECT_BINARY_DIR}/convelope.pc DESTINATION ${pkgconfig_dir})
