@echo off
rem SPDX-License-Identifier: EPL-2.0
rem Starts the built product on Windows; see tapwright.ps1 beside this file.
powershell -NoProfile -ExecutionPolicy Bypass -File "%~dp0tapwright.ps1" %*
exit /b %ERRORLEVEL%
